'use client';

import dynamic from 'next/dynamic';
import { Loading } from '@/ui/notices';

const loadBookDialog = () => import('./book-dialog').then((parts) => parts.BookDialog);
const loadSitDetail = () => import('./sit-detail').then((parts) => parts.SitDetail);

/** Parts that wait until they are asked for, so that the list itself comes soon over a poor signal. */
export const LazyBookDialog = dynamic(loadBookDialog, { ssr: false });

export const LazySitDetail = dynamic(loadSitDetail, {
  ssr: false,
  loading: () => <Loading label="Reading the stand" lines={4} />,
});

/** Called when a hand comes near what opens them. */
export function fetchBookDialog(): void {
  loadBookDialog().catch(() => undefined);
}

export function fetchSitDetail(): void {
  loadSitDetail().catch(() => undefined);
}
