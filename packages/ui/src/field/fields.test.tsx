import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { MeasureField, type MeasureEntry } from '../measure-field/MeasureField.tsx';
import { ChoiceRow } from './Choices.tsx';
import { ErrorSummary } from './ErrorSummary.tsx';
import { MoneyField, NumberField } from './FigureFields.tsx';
import { TextField } from './TextField.tsx';

afterEach(cleanup);
const user = userEvent.setup();

function Money({ start }: { start: number | null }) {
  const [amountMinor, setAmount] = useState(start);
  return (
    <>
      <MoneyField
        label="Most you would pay"
        amountMinor={amountMinor}
        currency="USD"
        stepMinor={5000}
        onChange={setAmount}
      />
      <output>{String(amountMinor)}</output>
    </>
  );
}

function Mass({ seen }: { seen: (entry: MeasureEntry) => void }) {
  const [entry, setEntry] = useState<MeasureEntry>({ text: '', unit: 'kg', value: null });
  const onChange = (next: MeasureEntry) => {
    setEntry(next);
    seen(next);
  };
  return <MeasureField label="Mass, net" kind="mass" entry={entry} onChange={onChange} />;
}

describe('a text field', () => {
  it('is tied to its hint and its error', () => {
    render(<TextField label="Town" hint="Where the lot stands" error="Enter a town" optional />);
    const input = screen.getByLabelText(/Town/);
    expect(input.getAttribute('aria-invalid')).toBe('true');
    const described = (input.getAttribute('aria-describedby') ?? '')
      .split(' ')
      .map((id) => document.getElementById(id)?.textContent);
    expect(described).toEqual(['Where the lot stands', 'Error: Enter a town']);
    expect(screen.getByText(/\(optional\)/)).toBeTruthy();
  });
});

describe('the money field', () => {
  it('keeps the typed text and holds minor units', async () => {
    render(<Money start={null} />);
    const input = screen.getByLabelText<HTMLInputElement>('Most you would pay');
    await user.type(input, '6,200.5');
    expect(input.value).toBe('6,200.5');
    expect(screen.getByRole('status').textContent).toBe('620050');
  });
  it('steps up and down', async () => {
    render(<Money start={620_000} />);
    await user.click(screen.getByRole('button', { name: '50 more' }));
    expect(screen.getByLabelText<HTMLInputElement>('Most you would pay').value).toBe('6,250');
    await user.click(screen.getByRole('button', { name: '50 less' }));
    expect(screen.getByRole('status').textContent).toBe('620000');
  });
  it('speaks up on leaving, not while typing', async () => {
    render(<Money start={null} />);
    const input = screen.getByLabelText('Most you would pay');
    await user.type(input, 'many');
    expect(screen.queryByText(/Enter an amount/)).toBeNull();
    await user.tab();
    expect(screen.getByText(/Enter an amount/)).toBeTruthy();
    expect(screen.getByRole('status').textContent).toBe('null');
  });
});

describe('the number field', () => {
  it('shows a share as per cent and holds a share', async () => {
    const held: (number | null)[] = [];
    function Share() {
      const [value, setValue] = useState<number | null>(0.95);
      held.push(value);
      return <NumberField label="Recovery" value={value} onChange={setValue} shownPer={100} suffix="%" />;
    }
    render(<Share />);
    const input = screen.getByLabelText<HTMLInputElement>('Recovery');
    expect(input.value).toBe('95');
    await user.clear(input);
    await user.type(input, '92.5 %');
    expect(held.at(-1)).toBe(0.925);
  });
});

describe('the measure field', () => {
  it('echoes a second unit and follows a typed one', async () => {
    const entries: MeasureEntry[] = [];
    render(<Mass seen={(entry) => entries.push(entry)} />);
    const input = screen.getByLabelText('Mass, net');
    await user.type(input, '12.4');
    expect(screen.getByText('27.3 lb')).toBeTruthy();
    await user.type(input, ' lb');
    expect(screen.getByLabelText<HTMLSelectElement>('Unit of mass, net').value).toBe('lb');
    expect(entries.at(-1)?.value).toBeCloseTo(12.4 * 453.59237, 6);
  });
  it('re-labels on another unit and converts only when asked', async () => {
    const entries: MeasureEntry[] = [];
    render(<Mass seen={(entry) => entries.push(entry)} />);
    await user.type(screen.getByLabelText('Mass, net'), '12');
    await user.selectOptions(screen.getByLabelText('Unit of mass, net'), 'lb');
    expect(entries.at(-1)).toEqual({ text: '12', unit: 'lb', value: 12 * 453.59237 });
    await user.click(screen.getByRole('button', { name: /^Convert 12.kg to 26\.46.lb\?$/ }));
    expect(entries.at(-1)?.text).toBe('26.46');
    expect(entries.at(-1)?.value).toBeCloseTo(12_000, -1);
    expect(screen.queryByRole('button', { name: /Convert/ })).toBeNull();
  });
});

describe('choices', () => {
  it('are radios of one group with their hints in the name', async () => {
    const chosen: string[] = [];
    const options = [
      { value: 'counted' as const, label: 'Counted', hint: 'each one' },
      { value: 'stated' as const, label: 'Estimate', hint: 'by eye' },
    ];
    render(
      <ChoiceRow
        legend="How do you know?"
        value="counted"
        options={options}
        onChange={(value) => chosen.push(value)}
      />,
    );
    expect(screen.getByRole('group', { name: 'How do you know?' })).toBeTruthy();
    await user.click(screen.getByRole('radio', { name: /Estimate/ }));
    expect(chosen).toEqual(['stated']);
  });
});

describe('the error summary', () => {
  it('takes the focus, marks the title and leads to the field', async () => {
    document.title = 'New lot';
    const problems = [{ fieldId: 'town', message: 'Enter a town' }];
    const { unmount } = render(
      <>
        <ErrorSummary problems={problems} />
        <TextField id="town" label="Town" />
      </>,
    );
    expect(document.activeElement?.textContent).toContain('There is a problem');
    expect(document.title).toBe('Error: New lot');
    await user.click(screen.getByRole('link', { name: 'Enter a town' }));
    expect(document.activeElement?.id).toBe('town');
    unmount();
    expect(document.title).toBe('New lot');
  });
  it('is not there without problems', () => {
    render(<ErrorSummary problems={[]} />);
    expect(screen.queryByText('There is a problem')).toBeNull();
  });
});
