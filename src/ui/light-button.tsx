import { Button, type ButtonProps } from './button';
import { LIGHT_NAMES, type Light } from './light';
import { LightSign } from './signs';

export function LightButton({ light, ...button }: ButtonProps & { light: Light }) {
  return (
    <Button look="quiet" className="justify-start" {...button}>
      <LightSign className="size-5" />
      <span>
        <span className="sr-only">Light: </span>
        {LIGHT_NAMES[light]}
      </span>
    </Button>
  );
}
