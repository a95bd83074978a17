'use client';

import { LocateFixed } from 'lucide-react';
import { useState } from 'react';
import { Button } from '@/ui/button';
import { FieldError } from '@/ui/field';
import { degreesText } from '../place-text';
import { HERE_WORDS } from '../words/forms';

/** Fills a place in from the phone of whoever stands there; it stays on the phone until the form is saved. */
export function HereButton({ onPlace }: { onPlace: (place: { lat: string; lon: string }) => void }) {
  const [pending, setPending] = useState(false);
  const [problem, setProblem] = useState<string>();

  function find() {
    if (!navigator.geolocation) {
      setProblem(HERE_WORDS.noPosition);
      return;
    }
    setPending(true);
    setProblem(undefined);
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        setPending(false);
        onPlace({ lat: degreesText(coords.latitude), lon: degreesText(coords.longitude) });
      },
      () => {
        setPending(false);
        setProblem(HERE_WORDS.refused);
      },
      { enableHighAccuracy: true, timeout: 20_000 },
    );
  }

  return (
    <div>
      <Button onClick={find} pending={pending} pendingLabel={HERE_WORDS.finding}>
        <LocateFixed aria-hidden="true" className="size-5" /> {HERE_WORDS.here}
      </Button>
      <FieldError>{problem}</FieldError>
    </div>
  );
}
