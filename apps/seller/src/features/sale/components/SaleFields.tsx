import type { LotDraft } from '@lydite/contracts';
import { ChoiceRow, MoneyField, Select } from '@lydite/ui';
import { counted } from '../../../lib/counted.ts';

type Sale = LotDraft['sale'];

interface SaleFieldsProps {
  sale: Sale;
  currency: string;
  onChange: (change: Partial<Sale>) => void;
}

const days = Array.from({ length: 14 }, (_, i) => ({ value: String(i + 1), label: counted(i + 1, 'day') }));

/** How the lot is sold, from what price, and for how long. */
export function SaleFields({ sale, currency, onChange }: SaleFieldsProps) {
  const price = (label: string, field: 'startMinor' | 'reserveMinor' | 'askingMinor', hint: string) => (
    <MoneyField
      label={label}
      id={`sale.${field}`}
      hint={hint}
      optional={field === 'reserveMinor'}
      currency={currency}
      amountMinor={sale[field]}
      onChange={(amountMinor) => onChange({ [field]: amountMinor || null })}
    />
  );
  return (
    <div className="fields">
      <ChoiceRow
        id="sale.form"
        legend="How do you sell it?"
        value={sale.form}
        options={[
          { value: 'open-bids', label: 'Open bids', hint: 'the highest bid at the close has it' },
          { value: 'asking-price', label: 'Asking price', hint: 'the first to take it has it' },
        ]}
        onChange={(form) => onChange({ form })}
      />
      {sale.form === 'open-bids' ? (
        <div className="field-pair items-end">
          {price('Start price', 'startMinor', 'Where bidding begins.')}
          {price('Lowest price', 'reserveMinor', 'Buyers read only whether it is reached.')}
        </div>
      ) : (
        price('Asking price', 'askingMinor', 'What a buyer pays for the lot, without freight.')
      )}
      <Select
        label="On the market for"
        id="sale.days"
        className="max-w-60"
        value={String(sale.days)}
        note="It closes on a full hour."
        options={days}
        onChange={(event) => onChange({ days: Number(event.target.value) })}
      />
    </div>
  );
}
