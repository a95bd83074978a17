'use client';

import { useEffect, useState } from 'react';
import { ZONE_WORDS } from './words/offline';

function offsetName(zone: string, at: Date, style: 'longOffset' | 'long'): string {
  const parts = new Intl.DateTimeFormat('en-US', { timeZone: zone, timeZoneName: style }).formatToParts(at);
  return parts.find((part) => part.type === 'timeZoneName')?.value ?? zone;
}

/** Names the club's zone to a reader whose own clock shows another time now; draws nothing otherwise. */
export function ZoneNote({ zone }: { zone: string }) {
  const [text, setText] = useState<string | null>(null);
  useEffect(() => {
    const now = new Date();
    const own = Intl.DateTimeFormat().resolvedOptions().timeZone;
    const differs = offsetName(zone, now, 'longOffset') !== offsetName(own, now, 'longOffset');
    setText(differs ? ZONE_WORDS.byClub(offsetName(zone, now, 'long')) : null);
  }, [zone]);
  return text && <p className="mb-3 text-ink-soft text-sm print:hidden">{text}</p>;
}
