'use client';

import { useRouter } from 'next/navigation';
import type { ComponentProps } from 'react';
import { askText } from '../read-addresses';
import { keepWeapon } from '../remember';

const isDay = (text: string) => /^20\d\d-\d\d-\d\d$/.test(text);

/** A plain form that also goes as soon as something is chosen. Its fields are drawn by the server. */
export function WindowForm({ action, ...rest }: ComponentProps<'form'> & { action: string }) {
  const router = useRouter();
  return (
    <form
      {...rest}
      method="get"
      action={action}
      onChange={({ currentTarget, target }) => {
        const chosen = Object.fromEntries([...new FormData(currentTarget)].map(([key, value]) => [key, String(value)]));
        // A date typed digit by digit is none until its year has four.
        if (chosen.day !== undefined && !isDay(chosen.day)) return;
        if (target instanceof HTMLSelectElement && target.name === 'weapon') keepWeapon(target.value);
        const asked = askText(chosen);
        router.push(asked ? `${action}?${asked}` : action);
      }}
    />
  );
}
