'use client';

import { Check, SunMoon } from 'lucide-react';
import * as Dropdown from 'radix-ui/dropdown-menu';
import { useState } from 'react';
import { Button } from './button';
import { LIGHT_COOKIE, LIGHT_NAMES, LIGHTS, type Light, lightPaper, parseLight } from './light';
import { MENU_CLASSES } from './menu';

const YEAR_SECONDS = 365 * 24 * 3600;

/** Keeps the choice for the server's next page and shows it at once on this one. */
export function setLight(light: Light) {
  // biome-ignore lint/suspicious/noDocumentCookie: the Cookie Store API is missing from older phones
  document.cookie = `${LIGHT_COOKIE}=${light}; path=/; max-age=${YEAR_SECONDS}; samesite=lax`;
  document.documentElement.dataset.light = light;
  const paper = lightPaper(light);
  if (typeof paper !== 'string') return;
  for (const meta of document.querySelectorAll('meta[name="theme-color"]')) meta.setAttribute('content', paper);
}

const NOTES: Record<Light, string> = {
  auto: 'as the device',
  day: 'paper',
  dark: 'for the evening',
  dim: 'red on black, keeps night eyes',
};

export function LightSwitch({ light: first }: { light: Light }) {
  const [light, keep] = useState(first);
  return (
    <Dropdown.Root modal={false}>
      <Dropdown.Trigger asChild>
        <Button look="quiet" className="justify-start">
          <SunMoon aria-hidden="true" className="size-5" />
          <span>
            <span className="sr-only">Light: </span>
            {LIGHT_NAMES[light]}
          </span>
        </Button>
      </Dropdown.Trigger>
      <Dropdown.Portal>
        <Dropdown.Content align="start" sideOffset={4} collisionPadding={8} className={MENU_CLASSES}>
          <Dropdown.RadioGroup
            value={light}
            onValueChange={(value) => {
              const next = parseLight(value);
              keep(next);
              setLight(next);
            }}
          >
            {LIGHTS.map((name) => (
              <Dropdown.RadioItem
                key={name}
                value={name}
                className="flex min-h-11 cursor-pointer items-center gap-3 py-2 pr-4 pl-10 outline-none data-highlighted:bg-sunk"
              >
                <Dropdown.ItemIndicator className="-ml-7 w-4">
                  <Check aria-hidden="true" className="size-4" />
                </Dropdown.ItemIndicator>
                <span>
                  {LIGHT_NAMES[name]} <span className="text-ink-soft text-sm">{NOTES[name]}</span>
                </span>
              </Dropdown.RadioItem>
            ))}
          </Dropdown.RadioGroup>
        </Dropdown.Content>
      </Dropdown.Portal>
    </Dropdown.Root>
  );
}
