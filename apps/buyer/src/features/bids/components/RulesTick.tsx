import { Checkbox } from '@lydite/ui';

interface RulesTickProps {
  accepted: boolean;
  error: string | null;
  onChange: (accepted: boolean) => void;
}

/** The rules of an outright lot, agreed to before an act that binds. */
export function RulesTick({ accepted, error, onChange }: RulesTickProps) {
  return (
    <Checkbox
      id="rules"
      label="I know the rules of this lot"
      hint="It is sold outright, as it stands. I can claim only on what was stated: mass, count, kind, plating, delivery, hazards. Gold only: other metals come with it and are in the price."
      checked={accepted}
      error={error}
      onChange={(event) => onChange(event.target.checked)}
    />
  );
}

export const rulesMissing = 'Tick that you know the rules of this lot';
