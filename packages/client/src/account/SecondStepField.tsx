import { TextField } from '@lydite/ui';
import { useState, type ComponentProps } from 'react';

type SecondStepFieldProps = Omit<ComponentProps<typeof TextField>, 'label' | 'hint' | 'inputMode' | 'autoComplete'>;

/** The app's six digits, with the keys for them on a phone; or a recovery code, which has letters too. */
export function SecondStepField(props: SecondStepFieldProps) {
  const [isRecovery, setRecovery] = useState(false);
  return (
    <div>
      <TextField
        {...props}
        label={isRecovery ? 'Recovery code' : 'Code of your authenticator app'}
        hint={isRecovery ? 'One you have not used yet.' : 'The six digits it shows now.'}
        inputMode={isRecovery ? 'text' : 'numeric'}
        autoComplete={isRecovery ? 'off' : 'one-time-code'}
        autoCapitalize="none"
        spellCheck={false}
      />
      <button type="button" className="link-button mt-2" onClick={() => setRecovery(!isRecovery)}>
        {isRecovery ? 'Use the app’s code' : 'Use a recovery code'}
      </button>
    </div>
  );
}
