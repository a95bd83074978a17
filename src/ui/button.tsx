import type { ComponentProps, ReactNode } from 'react';
import { type ButtonLook, buttonClasses } from './button-classes';
import { joinClasses } from './join-classes';
import { Link, type LinkProps } from './link';

export type { ButtonLook };
export { buttonClasses };

export interface ButtonProps extends ComponentProps<'button'> {
  look?: ButtonLook;
  /** Work under way: shows `pendingLabel`, and presses do nothing. */
  pending?: boolean;
  pendingLabel?: ReactNode;
}

export function Button({ look = 'plain', pending, pendingLabel, type = 'button', className, ...rest }: ButtonProps) {
  return (
    <button
      {...rest}
      type={type}
      aria-busy={pending || undefined}
      disabled={rest.disabled || pending}
      className={buttonClasses(look, className)}
    >
      {pending ? (pendingLabel ?? rest.children) : rest.children}
    </button>
  );
}

export interface ButtonLinkProps extends LinkProps {
  look?: ButtonLook;
}

export function ButtonLink({ look = 'plain', className, ...rest }: ButtonLinkProps) {
  return <Link {...rest} className={buttonClasses(look, className)} />;
}

/** A link in running text. */
export function TextLink({ className, ...rest }: LinkProps) {
  return (
    <Link
      {...rest}
      className={joinClasses(
        'text-moss underline decoration-1 underline-offset-[0.2em] hover:decoration-2 rounded-sm',
        className,
      )}
    />
  );
}
