import type { LotQuery } from '@lydite/contracts';
import { Caret } from '@lydite/ui';
import type { Catalogue } from '@lydite/valuation';
import { Link, useNavigate } from 'react-router-dom';
import { filtersOn, lotSearch, type LotFilter } from '../lot-search.ts';
import { LotSearchField } from './LotSearchField.tsx';

type Option = readonly [value: string, label: string];
type Chip = 'goldG' | 'massKg' | 'form' | 'closing' | 'sort';

const over = (unit: string, figures: readonly number[], noun: string): Option[] =>
  figures.map((figure) => [String(figure), `${noun} over ${figure} ${unit}`]);

const chips: readonly { key: Chip; label: string; options: readonly Option[] }[] = [
  { key: 'goldG', label: 'Expected gold', options: [['', 'Any gold'], ...over('g', [1, 5, 10, 50], 'Gold')] },
  { key: 'massKg', label: 'Mass', options: [['', 'Any mass'], ...over('kg', [10, 50, 100, 500], 'Mass')] },
  {
    key: 'form',
    label: 'Sale form',
    options: [
      ['', 'Bids or price'],
      ['open-bids', 'Open bids'],
      ['asking-price', 'Asking price'],
    ],
  },
  {
    key: 'closing',
    label: 'Closing',
    options: [
      ['', 'Closing any time'],
      ['today', 'Closing today'],
      ['3-days', 'Closing in 3 days'],
      ['week', 'Closing in a week'],
    ],
  },
];

const sortChip = {
  key: 'sort' as const,
  label: 'Order',
  options: [
    ['closes', 'Soonest close first'],
    ['-gold', 'Most gold first'],
    ['-grade', 'Richest first'],
    ['-mass', 'Heaviest first'],
    ['price', 'Lowest price first'],
    ['-listed', 'Newest first'],
  ] satisfies Option[],
};

interface LotFiltersProps {
  query: LotQuery;
  catalogue: Catalogue | undefined;
}

/** What narrows and orders the list: native selects, all of it in the address. */
export function LotFilters({ query, catalogue }: LotFiltersProps) {
  const navigate = useNavigate();
  const set = (key: keyof LotQuery, value: string) =>
    void navigate(
      { search: lotSearch(query, { [key]: value === '' ? undefined : value }) },
      { preventScrollReset: true },
    );
  const on = filtersOn(query);
  const kinds: Option[] = (catalogue?.classes ?? []).map(({ code, name }) => [code, name]);
  return (
    <div className="filters">
      <LotSearchField query={query} />
      <ChipSelect
        label="Kind"
        value={query.class ?? ''}
        options={[['', 'Any kind'], ...kinds]}
        isOn={on.includes('class')}
        onChange={(value) => set('class', value)}
      />
      {chips.map(({ key, label, options }) => (
        <ChipSelect
          key={key}
          label={label}
          value={String(query[key] ?? '')}
          options={withOwn(options, query[key])}
          isOn={on.includes(key as LotFilter)}
          onChange={(value) => set(key, value)}
        />
      ))}
      {on.length > 0 && (
        <Link className="btn btn-quiet" to={{ search: lotSearch({ sort: query.sort, page: 1 }, { q: query.q }) }}>
          Clear {on.length}
        </Link>
      )}
      <span className="rack-order">
        <ChipSelect
          label={sortChip.label}
          options={sortChip.options}
          value={query.sort}
          onChange={(value) => set('sort', value)}
        />
      </span>
    </div>
  );
}

/** An address may ask for a figure that is not on offer; the select shows it all the same. */
const withOwn = (options: readonly Option[], value: string | number | undefined): readonly Option[] =>
  value === undefined || options.some(([own]) => own === String(value))
    ? options
    : [...options, [String(value), `Over ${String(value)}`]];

interface ChipSelectProps {
  label: string;
  value: string;
  options: readonly Option[];
  isOn?: boolean;
  onChange: (value: string) => void;
}

function ChipSelect({ label, value, options, isOn = false, onChange }: ChipSelectProps) {
  return (
    <span className="chip-box">
      <select
        className={isOn ? 'chip on' : 'chip'}
        aria-label={label}
        value={value}
        onChange={(event) => onChange(event.target.value)}
      >
        {options.map(([option, text]) => (
          <option key={option} value={option}>
            {text}
          </option>
        ))}
      </select>
      <Caret />
    </span>
  );
}
