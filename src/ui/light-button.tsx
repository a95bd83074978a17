import { SunMoon } from 'lucide-react';
import { Button, type ButtonProps } from './button';
import { LIGHT_NAMES, type Light } from './light';

export function LightButton({ light, ...button }: ButtonProps & { light: Light }) {
  return (
    <Button look="quiet" className="justify-start" {...button}>
      <SunMoon aria-hidden="true" className="size-5" />
      <span>
        <span className="sr-only">Light: </span>
        {LIGHT_NAMES[light]}
      </span>
    </Button>
  );
}
