import type { LotDraft } from '@lydite/contracts';
import { Checkbox, ChoiceRow, Select, TextField } from '@lydite/ui';
import { countries } from '../../../lib/countries.ts';

type Declared = LotDraft['declarations'];

interface DeclarationsProps {
  declarations: Declared;
  onChange: (change: Partial<Declared>) => void;
}

/** What a seller declares of every lot, with the cautions where they matter. */
export function Declarations({ declarations, onChange }: DeclarationsProps) {
  const { rightToSell, batteries, batteriesNote, mercuryOrBeryllium, hazardNote, country } = declarations;
  return (
    <div className="fields">
      <ChoiceRow
        id="declarations.batteries"
        legend="Batteries"
        hint="Lithium cells can burn when crushed or shorted; carriers refuse them loose."
        value={batteries}
        options={[
          { value: 'removed', label: 'All removed' },
          { value: 'packed', label: 'Some are in the lot', hint: 'packed as the carrier demands' },
        ]}
        onChange={(value) => onChange({ batteries: value })}
      />
      {batteries === 'packed' && (
        <TextField
          label="How are the batteries packed?"
          id="declarations.batteriesNote"
          value={batteriesNote}
          onChange={(event) => onChange({ batteriesNote: event.target.value.slice(0, 200) })}
        />
      )}
      <ChoiceRow
        id="declarations.mercuryOrBeryllium"
        legend="Mercury relays, beryllium ceramics"
        hint="Mercury is poisonous, beryllium oxide dust causes lung disease: never open or break such parts."
        value={mercuryOrBeryllium}
        options={[
          { value: 'none', label: 'None in the lot' },
          { value: 'present', label: 'In the lot', hint: 'the desk looks at it' },
        ]}
        onChange={(value) => onChange({ mercuryOrBeryllium: value })}
      />
      {mercuryOrBeryllium === 'present' && (
        <TextField
          label="Which line holds them?"
          id="declarations.hazardNote"
          value={hazardNote}
          onChange={(event) => onChange({ hazardNote: event.target.value.slice(0, 200) })}
        />
      )}
      <Select
        label="Country the lot is in"
        id="declarations.country"
        className="max-w-96"
        note="Lots are sold within their country unless an operator has recorded the consent papers."
        value={country}
        onChange={(event) => onChange({ country: event.target.value })}
        options={[{ value: '', label: 'Choose the country' }, ...countries]}
      />
      <Checkbox
        id="declarations.rightToSell"
        label="I have the right to sell this lot, and data carriers in it are wiped or destroyed as the law demands."
        checked={rightToSell}
        onChange={(event) => onChange({ rightToSell: event.target.checked })}
      />
    </div>
  );
}
