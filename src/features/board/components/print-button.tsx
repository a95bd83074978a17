'use client';

import { Button } from '@/ui/button';
import { GATE_PAGE_WORDS } from '../words/gate-sheet';

/** Opens the browser's own print window: paper, or a PDF to send. */
export function PrintButton() {
  return (
    <Button look="primary" onClick={() => window.print()}>
      {GATE_PAGE_WORDS.print}
    </Button>
  );
}
