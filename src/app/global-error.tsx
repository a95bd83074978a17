'use client';

import { FaultPage, type FaultPageProps } from '@/ui/fault-page';
import './globals.css';

/** Stands in for the whole document, when even its frame threw. */
export default function GlobalErrorPage(props: FaultPageProps) {
  return (
    <html lang="en" data-light="auto">
      <body>
        <FaultPage {...props} />
      </body>
    </html>
  );
}
