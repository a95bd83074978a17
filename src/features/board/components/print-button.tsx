'use client';

import { Button } from '@/ui/button';

/** Opens the browser's own print window: paper, or a PDF to send. */
export function PrintButton() {
  return (
    <Button look="primary" onClick={() => window.print()}>
      Print or save as PDF
    </Button>
  );
}
