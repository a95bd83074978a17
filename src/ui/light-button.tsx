import { Button, type ButtonProps } from './button';
import type { Light } from './light';
import { LightSign } from './signs';
import { LIGHT_NAMES, LIGHT_WORDS } from './words/shell';

export function LightButton({ light, ...button }: ButtonProps & { light: Light }) {
  return (
    <Button look="quiet" className="justify-start" {...button}>
      <LightSign className="size-5" />
      <span>
        <span className="sr-only">{LIGHT_WORDS.light}</span>
        {LIGHT_NAMES[light]}
      </span>
    </Button>
  );
}
