import { useId, type ComponentPropsWithRef, type ReactNode } from 'react';
import { FieldError } from './Field.tsx';

export interface Choice<T extends string> {
  value: T;
  label: ReactNode;
  hint?: ReactNode;
  disabled?: boolean;
}

interface ChoiceRowProps<T extends string> {
  legend: ReactNode;
  id?: string;
  name?: string;
  hint?: ReactNode;
  error?: string | null;
  value: T | null;
  options: readonly Choice<T>[];
  onChange: (value: T) => void;
  onBlur?: () => void;
  /** One below the other, for longer labels. */
  stacked?: boolean;
}

/** One of a few, each as a block with its meaning under it. */
export function ChoiceRow<T extends string>(props: ChoiceRowProps<T>) {
  const { legend, id, name, hint, error, value, options, onChange, onBlur, stacked } = props;
  const ownId = useId();
  const groupId = id ?? ownId;
  const described = [hint && `${groupId}-hint`, error && `${groupId}-error`].filter(Boolean).join(' ') || undefined;
  return (
    <fieldset
      className={error ? 'field field-invalid' : 'field'}
      id={groupId}
      aria-describedby={described}
      tabIndex={-1}
    >
      <legend>{legend}</legend>
      {hint && (
        <p className="field-hint" id={`${groupId}-hint`}>
          {hint}
        </p>
      )}
      {error && <FieldError id={`${groupId}-error`}>{error}</FieldError>}
      <div className={stacked ? 'choices choices-stacked' : 'choices'}>
        {options.map((option) => (
          <label key={option.value} className="choice">
            <input
              type="radio"
              name={name ?? groupId}
              value={option.value}
              checked={option.value === value}
              disabled={option.disabled}
              onChange={() => onChange(option.value)}
              onBlur={onBlur}
            />
            {option.label}
            {option.hint && <small>{option.hint}</small>}
          </label>
        ))}
      </div>
    </fieldset>
  );
}

interface CheckboxProps extends Omit<ComponentPropsWithRef<'input'>, 'type'> {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | null;
}

/** One statement to agree to or not. */
export function Checkbox({ label, hint, error, id, ...input }: CheckboxProps) {
  const ownId = useId();
  const boxId = id ?? ownId;
  return (
    <div className={error ? 'field-invalid' : undefined}>
      {error && <FieldError id={`${boxId}-error`}>{error}</FieldError>}
      <label className="checkbox" htmlFor={boxId}>
        <input
          {...input}
          type="checkbox"
          id={boxId}
          aria-invalid={error ? true : undefined}
          aria-describedby={error ? `${boxId}-error` : undefined}
        />
        {label}
        {hint && <span className="small mute block">{hint}</span>}
      </label>
    </div>
  );
}
