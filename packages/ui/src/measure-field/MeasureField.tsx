import { useState } from 'react';
import { Caret } from '../field/Caret.tsx';
import { Field, type FieldProps } from '../field/Field.tsx';
import { NBSP } from '../text/characters.ts';
import { convertText, parseMeasure, type Measure } from './parse-measure.ts';
import { findUnit, unitsOf, type MeasureKind } from './units.ts';

/** What a page keeps of a measure: the entered text and unit, and what they mean. */
export interface MeasureEntry {
  text: string;
  unit: string;
  /** In the kind's base unit (g, µm, mm, cm², g/t); null when empty or unreadable. */
  value: number | null;
}

interface MeasureFieldProps extends FieldProps {
  kind: MeasureKind;
  entry: Pick<MeasureEntry, 'text' | 'unit'>;
  onChange: (entry: MeasureEntry) => void;
  onBlur?: () => void;
  /** Limits the list of units; all of the kind unless given. */
  units?: readonly string[];
  disabled?: boolean;
}

const examples: Record<MeasureKind, string> = {
  mass: '12.4 kg or 27 lb 5 oz',
  gold: '3.2 g',
  plating: '0.76 µm or 30 µin',
  length: '85 mm',
  area: '2.4 cm²',
  grade: '740 g/t',
};

interface ConversionOffer {
  from: string;
  text: string;
  measure: Measure;
}

/**
 * A measured figure with its unit beside it. A unit typed after the figure wins over the list.
 * Choosing another unit re-labels the figure, since the usual error is a wrong unit; converting is offered, never done unasked.
 */
export function MeasureField({ kind, entry, onChange, onBlur, units, disabled, ...frame }: MeasureFieldProps) {
  const [hasLeft, setHasLeft] = useState(false);
  const [offer, setOffer] = useState<ConversionOffer | null>(null);
  const parsed = parseMeasure(entry.text, { kind, unit: entry.unit });
  const label = (id: string) => findUnit(kind, id)?.label ?? id;
  const cantRead =
    hasLeft && entry.text.trim() !== '' && !parsed ? `Enter a figure and its unit, such as ${examples[kind]}` : null;

  const set = (text: string, unit: string) => {
    const measure = parseMeasure(text, { kind, unit });
    onChange({ text, unit: measure?.unit ?? unit, value: measure?.value ?? null });
  };
  const chooseUnit = (unit: string) => {
    setOffer(parsed ? { from: entry.unit, text: entry.text, measure: parsed } : null);
    set(entry.text.replace(/[^\d.,'’\s−-].*$/, '').trim(), unit);
  };
  const target = findUnit(kind, entry.unit);
  const converted = offer && target && offer.from !== entry.unit ? convertText(offer.measure.value, target) : null;

  return (
    <Field {...frame} error={frame.error ?? cantRead} note={frame.note ?? (parsed?.echo || null)}>
      {(wiring) => (
        <>
          <span className="input">
            <input
              {...wiring}
              type="text"
              className="figure"
              autoComplete="off"
              disabled={disabled}
              value={entry.text}
              onChange={(event) => {
                setHasLeft(false);
                setOffer(null);
                set(event.target.value, entry.unit);
              }}
              onBlur={() => {
                setHasLeft(true);
                onBlur?.();
              }}
            />
            <span className="input-select input-unit">
              <select
                aria-label={typeof frame.label === 'string' ? `Unit of ${frame.label.toLowerCase()}` : 'Unit'}
                value={entry.unit}
                disabled={disabled}
                onChange={(event) => chooseUnit(event.target.value)}
              >
                {unitsOf(kind)
                  .filter(({ id }) => !units || units.includes(id))
                  .map(({ id, label: name }) => (
                    <option key={id} value={id}>
                      {name}
                    </option>
                  ))}
              </select>
              <Caret />
            </span>
          </span>
          {offer && converted && (
            <button
              type="button"
              className="link-button small"
              onClick={() => {
                setOffer(null);
                set(converted, entry.unit);
              }}
            >
              Convert {offer.text}
              {NBSP}
              {label(offer.from)} to {converted}
              {NBSP}
              {label(entry.unit)}?
            </button>
          )}
        </>
      )}
    </Field>
  );
}
