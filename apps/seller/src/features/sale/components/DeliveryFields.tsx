import type { LotDraft } from '@lydite/contracts';
import { ChoiceRow, MoneyField, TextField } from '@lydite/ui';

type Delivery = LotDraft['delivery'];

interface DeliveryFieldsProps {
  delivery: Delivery;
  currency: string;
  onChange: (change: Partial<Delivery>) => void;
}

/** How the lot reaches the buyer, and at whose risk. */
export function DeliveryFields({ delivery, currency, onChange }: DeliveryFieldsProps) {
  return (
    <div className="fields">
      <ChoiceRow
        id="delivery.way"
        legend="How does it reach the buyer?"
        value={delivery.way}
        options={[
          { value: 'seller-sends', label: 'You send it', hint: 'insured by you, at your risk until received' },
          { value: 'collection', label: 'Collection', hint: 'at the buyer’s risk from the hand-over' },
        ]}
        onChange={(way) => onChange({ way })}
      />
      <div className="field-pair items-end">
        <TextField
          label="Where the lot is"
          id="delivery.place"
          hint="A town is enough."
          value={delivery.place}
          onChange={(event) => onChange({ place: event.target.value.slice(0, 60) })}
        />
        {delivery.way === 'seller-sends' ? (
          <MoneyField
            label="Freight"
            id="delivery.freightMinor"
            hint="Paid by the buyer; 0 if you bear it."
            currency={currency}
            amountMinor={delivery.freightMinor}
            onChange={(freightMinor) => onChange({ freightMinor })}
          />
        ) : (
          <TextField
            label="Hours of collection"
            id="delivery.hours"
            hint="Such as Mon to Fri, 8:00 to 16:00."
            value={delivery.hours}
            onChange={(event) => onChange({ hours: event.target.value.slice(0, 120) })}
          />
        )}
      </div>
    </div>
  );
}
