'use client';

import { FaultPage, type FaultPageProps } from '@/ui/fault-page';

export default function ErrorPage(props: FaultPageProps) {
  return <FaultPage {...props} />;
}
