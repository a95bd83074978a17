import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { LIGHT_COOKIE, parseLight } from '@/ui/light';
import { PlainShell } from '@/ui/plain-shell';

interface Props {
  width?: 'form' | 'page';
  links?: ReactNode;
  children: ReactNode;
}

/** The frame of pages without a club, in the light the reader chose. */
export async function PlainFrame({ width, links, children }: Props) {
  const light = parseLight((await cookies()).get(LIGHT_COOKIE)?.value);
  return (
    <PlainShell light={light} width={width} links={links}>
      {children}
    </PlainShell>
  );
}
