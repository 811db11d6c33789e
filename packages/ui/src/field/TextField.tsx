import type { ComponentPropsWithRef, ReactNode } from 'react';
import { Caret } from './Caret.tsx';
import { Field, type FieldProps } from './Field.tsx';

type Native<T extends 'input' | 'textarea' | 'select'> = Omit<ComponentPropsWithRef<T>, keyof FieldProps>;

type TextFieldProps = FieldProps & Native<'input'> & { prefix?: ReactNode; suffix?: ReactNode };

/** A line of text. Native attributes and the ref go to the input, so form libraries can register it. */
export function TextField({
  label,
  id,
  hint,
  error,
  optional,
  note,
  className,
  prefix,
  suffix,
  ...input
}: TextFieldProps) {
  return (
    <Field {...{ label, id, hint, error, optional, note, className }}>
      {(wiring) => (
        <span className="input">
          {prefix && <span className="input-fix">{prefix}</span>}
          <input type="text" {...input} {...wiring} />
          {suffix && <span className="input-fix input-fix-end">{suffix}</span>}
        </span>
      )}
    </Field>
  );
}

/** Several lines of text. */
export function TextArea({
  label,
  id,
  hint,
  error,
  optional,
  note,
  className,
  ...input
}: FieldProps & Native<'textarea'>) {
  return (
    <Field {...{ label, id, hint, error, optional, note, className }}>
      {(wiring) => (
        <span className="input">
          <textarea rows={4} {...input} {...wiring} />
        </span>
      )}
    </Field>
  );
}

type SelectProps = FieldProps & Native<'select'> & { options?: readonly { value: string; label: string }[] };

/** One of many, as the platform's own list. */
export function Select({
  label,
  id,
  hint,
  error,
  optional,
  note,
  className,
  options,
  children,
  ...input
}: SelectProps) {
  return (
    <Field {...{ label, id, hint, error, optional, note, className }}>
      {(wiring) => (
        <span className="input">
          <span className="input-select">
            <select {...input} {...wiring}>
              {options?.map(({ value, label: text }) => (
                <option key={value} value={value}>
                  {text}
                </option>
              ))}
              {children}
            </select>
            <Caret />
          </span>
        </span>
      )}
    </Field>
  );
}
