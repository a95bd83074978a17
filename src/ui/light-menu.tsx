'use client';

import * as Dropdown from 'radix-ui/dropdown-menu';
import { LIGHTS, type Light, parseLight } from './light';
import { LightButton } from './light-button';
import { MENU_CLASSES } from './open-menu';
import { TickSign } from './signs';
import { LIGHT_NOTES } from './words/opened';
import { LIGHT_NAMES } from './words/shell';

export interface LightMenuProps {
  light: Light;
  onChoose: (light: Light) => void;
}

/** The choice of light, open as soon as it is there: see LightSwitch. */
export function LightMenu({ light, onChoose }: LightMenuProps) {
  return (
    <Dropdown.Root modal={false} defaultOpen>
      <Dropdown.Trigger asChild>
        <LightButton light={light} />
      </Dropdown.Trigger>
      <Dropdown.Portal>
        <Dropdown.Content align="start" sideOffset={4} collisionPadding={8} className={MENU_CLASSES}>
          <Dropdown.RadioGroup value={light} onValueChange={(value) => onChoose(parseLight(value))}>
            {LIGHTS.map((name) => (
              <Dropdown.RadioItem
                key={name}
                value={name}
                className="flex min-h-11 cursor-pointer items-center gap-3 py-2 pr-4 pl-10 outline-none data-highlighted:bg-sunk"
              >
                <Dropdown.ItemIndicator className="-ml-7 w-4">
                  <TickSign className="size-4" />
                </Dropdown.ItemIndicator>
                <span>
                  {LIGHT_NAMES[name]} <span className="text-ink-soft text-sm">{LIGHT_NOTES[name]}</span>
                </span>
              </Dropdown.RadioItem>
            ))}
          </Dropdown.RadioGroup>
        </Dropdown.Content>
      </Dropdown.Portal>
    </Dropdown.Root>
  );
}
