import { useId, type ReactNode } from 'react';

export interface FieldProps {
  label: ReactNode;
  /** Given where a page links to the field, such as an error summary. */
  id?: string;
  hint?: ReactNode;
  error?: string | null;
  optional?: boolean;
  /** Shown under the input: a reading in a second unit, the next possible bid. */
  note?: ReactNode;
  className?: string;
}

/** What an input needs to be tied to its label, hint and error. */
export interface FieldWiring {
  id: string;
  'aria-describedby'?: string;
  'aria-invalid'?: true;
}

interface FieldFrameProps extends FieldProps {
  children: (wiring: FieldWiring) => ReactNode;
}

/** Label, hint and error around any single input; the error stands before the input, where the eye and a reader meet it first. */
export function Field({ label, id, hint, error, optional, note, className, children }: FieldFrameProps) {
  const ownId = useId();
  const inputId = id ?? ownId;
  const described = [hint && `${inputId}-hint`, error && `${inputId}-error`, note && `${inputId}-note`]
    .filter(Boolean)
    .join(' ');
  return (
    <div className={['field', error && 'field-invalid', className].filter(Boolean).join(' ')}>
      <label className="field-label" htmlFor={inputId}>
        {label}
        {optional && <span className="field-optional"> (optional)</span>}
      </label>
      {hint && (
        <p className="field-hint" id={`${inputId}-hint`}>
          {hint}
        </p>
      )}
      {error && <FieldError id={`${inputId}-error`}>{error}</FieldError>}
      {children({ id: inputId, 'aria-describedby': described || undefined, 'aria-invalid': error ? true : undefined })}
      {note && (
        <p className="field-echo" id={`${inputId}-note`}>
          {note}
        </p>
      )}
    </div>
  );
}

/** One field's error in words; the same words stand in the summary. */
export function FieldError({ id, children }: { id: string; children: ReactNode }) {
  return (
    <p className="field-error" id={id}>
      <span className="sr-only">Error: </span>
      {children}
    </p>
  );
}
