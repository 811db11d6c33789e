import { Select } from '@lydite/ui';
import type { Catalogue, MaterialGroup } from '@lydite/valuation';
import { classOf, groupNames } from '../line-words.ts';

interface KindFieldProps {
  id: string;
  catalogue: Catalogue;
  classCode: string | null;
  onChange: (classCode: string | null) => void;
}

/** What kind of material a line is, by how it is built; with the caution of that kind. */
export function KindField({ id, catalogue, classCode, onChange }: KindFieldProps) {
  const groups = Object.entries(groupNames) as [MaterialGroup, string][];
  const kind = classOf(catalogue, classCode);
  return (
    <Select
      label="Kind"
      id={id}
      value={kind ? kind.code : ''}
      note={kind?.hazards}
      onChange={(event) => onChange(event.target.value || null)}
    >
      <option value="">Choose the kind</option>
      {groups.map(([group, name]) => (
        <optgroup key={group} label={name}>
          {catalogue.classes
            .filter((one) => one.group === group)
            .map((one) => (
              <option key={one.code} value={one.code}>
                {one.name}
              </option>
            ))}
        </optgroup>
      ))}
    </Select>
  );
}
