'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import { CopyField } from '@/ui/copy-field';
import { sitAddress } from '../sit-address';
import type { SitsView } from '../view-types';

/** A link that opens this stand in this window, for people of the club only: anybody else must sign in and gets nowhere. */
export function ShareSit({ view, standId }: { view: SitsView; standId: string }) {
  const [open, setOpen] = useState(false);
  if (!open) return <Button onClick={() => setOpen(true)}>Share this sit</Button>;
  const { day, window } = view.window;
  const address = sitAddress(view.club.slug, { day, window, stand: standId });
  return (
    <CopyField
      label="Link to this sit"
      hint="Only members of the club can open it."
      value={`${globalThis.location.origin}${address}`}
    />
  );
}
