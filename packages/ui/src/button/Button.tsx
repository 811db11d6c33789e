import type { ComponentPropsWithRef, MouseEvent } from 'react';

type ButtonLook = 'plain' | 'primary' | 'quiet' | 'danger';

const looks: Record<ButtonLook, string> = {
  plain: 'btn',
  primary: 'btn btn-primary',
  quiet: 'btn btn-quiet',
  danger: 'btn btn-danger',
};

/** Class names of a button, for links that look like one. */
export function buttonClass(look: ButtonLook = 'plain'): string {
  return looks[look];
}

interface ButtonProps extends ComponentPropsWithRef<'button'> {
  look?: ButtonLook;
  /** While a request runs: the words to show. A button that has it sends once: the second half of a double press does nothing. */
  busy?: string | false;
}

/** A button. It stays focusable while busy, so that a reader hears what it is doing. */
export function Button({ look = 'plain', busy, className, children, onClick, type = 'button', ...rest }: ButtonProps) {
  const press = (event: MouseEvent<HTMLButtonElement>) => {
    if (busy === undefined || event.detail < 2) return onClick?.(event);
    event.preventDefault();
  };
  return (
    <button
      {...rest}
      type={busy ? 'button' : type}
      className={className ? `${looks[look]} ${className}` : looks[look]}
      aria-disabled={busy ? true : rest['aria-disabled']}
      onClick={busy ? undefined : press}
    >
      {busy || children}
    </button>
  );
}
