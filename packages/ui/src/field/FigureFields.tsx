import { useState, type ReactNode } from 'react';
import { parseMoneyMinor, parseNumber } from '../measure-field/parse-number.ts';
import { MINUS } from '../text/characters.ts';
import { currencySign } from '../text/format-money.ts';
import { formatNumber } from '../text/format-number.ts';
import { Field, type FieldProps } from './Field.tsx';
import { useFigureText } from './use-figure-text.ts';

interface FigureProps extends FieldProps {
  value: number | null;
  /** Called while typing, with null for text that can't be read. */
  onChange: (value: number | null) => void;
  onBlur?: () => void;
  name?: string;
  disabled?: boolean;
}

interface FigureInputProps extends FigureProps {
  parse: (text: string) => number | null;
  format: (value: number) => string;
  /** Said on leaving the field when the text can't be read. */
  unreadable: string;
  prefix?: ReactNode;
  suffix?: ReactNode;
  steps?: { less: ReactNode; more: ReactNode };
  isWhole?: boolean;
}

/** Errors of form appear on leaving the field, never while typing. */
function FigureInput({ parse, format, unreadable, prefix, suffix, steps, isWhole, ...props }: FigureInputProps) {
  const { value, onChange, onBlur, name, disabled, error, ...frame } = props;
  const [text, setText] = useFigureText({ value, parse, format });
  const [hasLeft, setHasLeft] = useState(false);
  const cantRead = hasLeft && text.trim() !== '' && parse(text) === null ? unreadable : null;
  return (
    <Field {...frame} error={error ?? cantRead}>
      {(wiring) => (
        <span className="input">
          {prefix && <span className="input-fix">{prefix}</span>}
          <input
            {...wiring}
            type="text"
            className="figure"
            inputMode={isWhole ? 'numeric' : undefined}
            autoComplete="off"
            name={name}
            disabled={disabled}
            value={text}
            onChange={(event) => {
              setHasLeft(false);
              setText(event.target.value);
              onChange(parse(event.target.value));
            }}
            onBlur={() => {
              setHasLeft(true);
              onBlur?.();
            }}
          />
          {suffix && <span className="input-fix input-fix-end">{suffix}</span>}
          {steps?.less}
          {steps?.more}
        </span>
      )}
    </Field>
  );
}

interface MoneyFieldProps extends Omit<FigureProps, 'value' | 'onChange'> {
  /** Integer minor units. */
  amountMinor: number | null;
  onChange: (amountMinor: number | null) => void;
  currency: string;
  /** Adds a button on either side of one step, minor units. */
  stepMinor?: number;
}

const plainMoney = (amountMinor: number) =>
  formatNumber(amountMinor / 100, { minimumFractionDigits: amountMinor % 100 === 0 ? 0 : 2, maximumFractionDigits: 2 });

/** An amount of money, held in integer minor units and typed in any usual way. */
export function MoneyField({ amountMinor, currency, stepMinor, onChange, ...props }: MoneyFieldProps) {
  const step = (by: number) => onChange(Math.max(0, (amountMinor ?? 0) + by));
  const button = (by: number, sign: string, word: string) => (
    <button
      type="button"
      disabled={props.disabled}
      aria-label={`${plainMoney(Math.abs(by))} ${word}`}
      onClick={() => step(by)}
    >
      {sign}
    </button>
  );
  return (
    <FigureInput
      {...props}
      value={amountMinor}
      onChange={onChange}
      parse={parseMoneyMinor}
      format={plainMoney}
      unreadable="Enter an amount of money, such as 6,200 or 6,200.50"
      prefix={currencySign(currency).trim()}
      steps={stepMinor ? { less: button(-stepMinor, MINUS, 'less'), more: button(stepMinor, '+', 'more') } : undefined}
    />
  );
}

interface NumberFieldProps extends FigureProps {
  prefix?: ReactNode;
  suffix?: ReactNode;
  /** Whole numbers only, with the digits' keypad on phones. */
  isWhole?: boolean;
  /** Factor between the shown and the held figure: 100 shows a share of one as per cent. */
  shownPer?: number;
}

/** A bare figure: a count, a share, a number of days. Never `type=number`, which scrolling changes. */
export function NumberField({ isWhole = false, shownPer = 1, ...props }: NumberFieldProps) {
  const parse = (text: string) => {
    const parsed = parseNumber(text.replace(/%\s*$/, ''));
    if (!parsed || parsed.value < 0 || (isWhole && !Number.isInteger(parsed.value))) return null;
    // Keeps 95 / 100 the same figure whichever way it was reached.
    return Number((parsed.value / shownPer).toPrecision(12));
  };
  return (
    <FigureInput
      {...props}
      isWhole={isWhole}
      parse={parse}
      format={(value) => formatNumber(value * shownPer, { maximumFractionDigits: 6 })}
      unreadable={isWhole ? 'Enter a whole number, such as 160' : 'Enter a number, such as 12.4'}
    />
  );
}
