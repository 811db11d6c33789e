import { Refusal, useTitle } from '@lydite/client';
import { Button } from '@lydite/ui';
import { useState, type FormEvent, type ReactNode } from 'react';
import { RulesTick, rulesMissing } from './RulesTick.tsx';

interface BindingFormProps {
  /** The page's own title, marked while the tick is missing. */
  title: string;
  button: string;
  isSending: boolean;
  refusal: ReactNode;
  onSend: () => void;
  /** The way back, and other ways out. */
  children?: ReactNode;
}

/** The tick for the rules and the one button that binds; a second press while sending does nothing. */
export function BindingForm({ title, button, isSending, refusal, onSend, children }: BindingFormProps) {
  const [accepted, setAccepted] = useState(false);
  const [isMissing, setMissing] = useState(false);
  useTitle(title, { invalid: isMissing });
  const send = (event: FormEvent) => {
    event.preventDefault();
    setMissing(!accepted);
    if (accepted) onSend();
    else document.getElementById('rules')?.focus();
  };
  return (
    <form onSubmit={send} noValidate className="fields mt-6">
      <RulesTick
        accepted={accepted}
        error={isMissing ? rulesMissing : null}
        onChange={(next) => {
          setAccepted(next);
          setMissing(false);
        }}
      />
      {refusal && <RefusalLine>{refusal}</RefusalLine>}
      <div className="actions mt-0">
        <Button look="primary" type="submit" busy={isSending && 'Sending'}>
          {button}
        </Button>
        {children}
      </div>
    </form>
  );
}

const RefusalLine = ({ children }: { children: ReactNode }) =>
  typeof children === 'string' ? <Refusal>{children}</Refusal> : children;
