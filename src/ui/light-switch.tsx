'use client';

import { useState } from 'react';
import { LazyPart, makeLazy } from './lazy-part';
import type { Light } from './light';
import { LightButton } from './light-button';
import type { LightMenuProps } from './light-menu';
import { setLight } from './set-light';

const lazyLightMenu = makeLazy<LightMenuProps>(() => import('./light-menu').then((parts) => parts.LightMenu));

export function LightSwitch({ light: first }: { light: Light }) {
  const [light, keep] = useState(first);
  const choose = (next: Light) => {
    keep(next);
    setLight(next);
  };
  return (
    <LazyPart
      of={lazyLightMenu}
      part={{ light, onChoose: choose }}
      closed={({ ahead, open }) => (
        <LightButton {...ahead} light={light} aria-haspopup="menu" aria-expanded={false} onClick={open} />
      )}
    />
  );
}
