import { Checkbox, FieldError } from '@lydite/ui';
import type { ComponentProps } from 'react';

type Input = Pick<ComponentProps<'input'>, 'name' | 'onChange' | 'onBlur' | 'ref'>;

/** What a member wants to do here; both is fine. */
export function RolesField({ error, input }: { error: string | null; input: Input }) {
  return (
    <fieldset className={error ? 'field field-invalid' : 'field'} id="roles" tabIndex={-1}>
      <legend>What do you want to do?</legend>
      {error && <FieldError id="roles-error">{error}</FieldError>}
      <Checkbox {...input} value="seller" label="Sell lots" hint="Boards, contacts, processors and chips you have" />
      <Checkbox {...input} value="buyer" label="Buy lots" hint="You recover the gold, or trade in lots" />
    </fieldset>
  );
}
