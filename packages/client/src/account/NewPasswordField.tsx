import { passwordLimits } from '@lydite/contracts';
import { TextField } from '@lydite/ui';
import { useState, type ComponentProps } from 'react';

/** A password to choose: it can be pasted and looked at, so nothing has to be typed twice. */
export function NewPasswordField(props: ComponentProps<typeof TextField>) {
  const [isShown, setShown] = useState(false);
  return (
    <TextField
      hint={`At least ${passwordLimits.min} characters; several words in a row do well`}
      {...props}
      type={isShown ? 'text' : 'password'}
      autoComplete="new-password"
      spellCheck={false}
      suffix={
        <button
          type="button"
          className="link-button"
          aria-pressed={isShown}
          aria-label="Show the password"
          onClick={() => setShown(!isShown)}
        >
          {isShown ? 'Hide' : 'Show'}
        </button>
      }
    />
  );
}
