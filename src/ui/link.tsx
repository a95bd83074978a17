import NextLink from 'next/link';
import type { ComponentProps } from 'react';

export type LinkProps = ComponentProps<typeof NextLink>;

/**
 * Leads to another page without fetching any of it ahead: no page has a frame to show before its rows, and where a phone
 * has one bar of signal each request counts.
 */
export function Link(props: LinkProps) {
  return <NextLink prefetch={false} {...props} />;
}
