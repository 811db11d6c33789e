import { Refusal } from '@lydite/client';
import type { RequestForm } from '@lydite/client/form';
import type { BuyingTerms } from '@lydite/contracts';
import { Button, Checkbox, ErrorSummary, MoneyField, NumberField } from '@lydite/ui';
import { keepFocus } from '../../../lib/keep-focus.ts';
import { Controller, type FieldPathByValue } from 'react-hook-form';

type FigureName = FieldPathByValue<BuyingTerms, number>;

interface FigureSpec {
  name: FigureName;
  label: string;
  hint: string;
  /** Said when the figure is missing or out of its range. */
  refusal: string;
}

const shares: readonly FigureSpec[] = [
  {
    name: 'recoveryYield',
    label: 'Recovery yield',
    hint: 'How much of the gold in a lot your process brings out.',
    refusal: 'Enter the recovery yield, from 0 to 100 %',
  },
  {
    name: 'accountableShare',
    label: 'Accountable share',
    hint: 'How much of the recovered gold your refiner pays for.',
    refusal: 'Enter the accountable share, from 0 to 100 %',
  },
];
const costs: readonly FigureSpec[] = [
  {
    name: 'processingPerKgMinor',
    label: 'Cost per kilogram',
    hint: 'Work, energy, supplies and disposal, for each kilogram of a lot.',
    refusal: 'Enter the cost per kilogram, such as 2.50',
  },
  {
    name: 'batchCostMinor',
    label: 'Cost per batch',
    hint: 'What a lot costs you whatever its mass: setting up, permits, sending the gold.',
    refusal: 'Enter the cost per batch, such as 120',
  },
];
const wishes: readonly FigureSpec[] = [
  {
    name: 'wantedChance',
    label: 'Wanted chance of not losing money',
    hint: '80 % means: in 8 of 10 results you come out ahead or even.',
    refusal: 'Enter the wanted chance, from 50 to 99 %',
  },
  {
    name: 'marginShare',
    label: 'Wanted margin',
    hint: 'Expected profit as a part of the bid.',
    refusal: 'Enter the wanted margin, from 0 to 500 %',
  },
];
const rivals: FigureSpec = {
  name: 'rivals',
  label: 'Other bidders of like skill',
  hint: 'How many you usually bid against.',
  refusal: 'Enter the number of other bidders, from 0 to 50',
};

const refusals = new Map<string, string>(
  [...shares, ...costs, ...wishes, rivals].map((one) => [one.name, one.refusal]),
);

interface TermsFormProps extends RequestForm<BuyingTerms> {
  currency: string;
}

/** A buyer's own terms, each with its unit and what it means. */
export function TermsForm({ form, submit, field, problems, refusal, isSending, currency }: TermsFormProps) {
  const figure = ({ name, label, hint, refusal: words }: FigureSpec, kind: 'share' | 'money' | 'count') => (
    <Controller
      key={name}
      control={form.control}
      name={name}
      render={({ field: { value, onChange, onBlur } }) => {
        const common = { id: name, label, hint, error: field(name).error && words, onBlur };
        const held = Number.isFinite(value) ? value : null;
        // An unreadable text is held as no number, which the schema then refuses beside its field.
        const change = (next: number | null) => onChange(next ?? Number.NaN);
        if (kind === 'money')
          return <MoneyField {...common} currency={currency} amountMinor={held} onChange={change} />;
        return kind === 'share' ? (
          <NumberField {...common} value={held} onChange={change} shownPer={100} suffix="%" />
        ) : (
          <NumberField {...common} value={held} onChange={change} isWhole suffix="buyers" />
        );
      }}
    />
  );
  return (
    <form onSubmit={submit} noValidate className="mt-6">
      <ErrorSummary
        problems={problems.map(({ fieldId, message }) => ({ fieldId, message: refusals.get(fieldId) ?? message }))}
      />
      <h2>From gold to money</h2>
      <div className="fields mt-3">{shares.map((spec) => figure(spec, 'share'))}</div>
      <h2 className="mt-8">Your costs</h2>
      <div className="fields mt-3">{costs.map((spec) => figure(spec, 'money'))}</div>
      <h2 className="mt-8">What you want to be left with</h2>
      <div className="fields mt-3">
        {wishes.map((spec) => figure(spec, 'share'))}
        <Checkbox
          {...form.register('curseOn')}
          id="curseOn"
          label="Allow for winning"
          hint="Whoever wins among several has on average read the lot too high. This takes that off the gold you count on."
        />
        {figure(rivals, 'count')}
      </div>
      <div className="fields mt-6">
        <Refusal>{refusal}</Refusal>
        <Button
          look="primary"
          type="submit"
          className="justify-self-start"
          busy={isSending && 'Sending'}
          onMouseDown={keepFocus}
        >
          Keep these terms
        </Button>
      </div>
    </form>
  );
}
