'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import { CopyField } from '@/ui/copy-field';
import { sitAddress } from '../sit-address';
import type { SitsBrief } from '../view-types';
import { SHARE_SIT_WORDS } from '../words/detail';

/** A link that opens this stand in this window, for people of the club only: anybody else must sign in and gets nowhere. */
export function ShareSit({ view, standId }: { view: SitsBrief; standId: string }) {
  const [open, setOpen] = useState(false);
  if (!open) return <Button onClick={() => setOpen(true)}>{SHARE_SIT_WORDS.share}</Button>;
  const { day, window } = view.window;
  const address = sitAddress(view.club.slug, { day, window, stand: standId });
  return (
    <CopyField
      label={SHARE_SIT_WORDS.link}
      hint={SHARE_SIT_WORDS.hint}
      value={`${globalThis.location.origin}${address}`}
    />
  );
}
