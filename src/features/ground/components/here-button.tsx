'use client';

import { LocateFixed } from 'lucide-react';
import { useState } from 'react';
import { Button } from '@/ui/button';
import { FieldError } from '@/ui/field';
import { degreesText } from '../place-text';

/** Fills a place in from the phone of whoever stands there; it stays on the phone until the form is saved. */
export function HereButton({ onPlace }: { onPlace: (place: { lat: string; lon: string }) => void }) {
  const [pending, setPending] = useState(false);
  const [problem, setProblem] = useState<string>();

  function find() {
    if (!navigator.geolocation) {
      setProblem('This device tells no position: type the numbers.');
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
        setProblem('The position could not be had: allow it, or type the numbers.');
      },
      { enableHighAccuracy: true, timeout: 20_000 },
    );
  }

  return (
    <div>
      <Button onClick={find} pending={pending} pendingLabel="Finding the place…">
        <LocateFixed aria-hidden="true" className="size-5" /> I am standing there
      </Button>
      <FieldError>{problem}</FieldError>
    </div>
  );
}
