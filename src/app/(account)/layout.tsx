import type { ReactNode } from 'react';
import { PlainFrame } from '../plain-frame';

export default function AccountLayout({ children }: { children: ReactNode }) {
  return <PlainFrame>{children}</PlainFrame>;
}
