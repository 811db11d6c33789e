import { zodResolver } from '@hookform/resolvers/zod';
import type { FieldProblem } from '@lydite/ui';
import { useForm, type DefaultValues, type FieldValues, type Path, type UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import { isApiError } from '../call/api-error.ts';

interface RequestFormOptions<V extends FieldValues> {
  /** The server's own schema of the request. */
  schema: z.ZodType<V, V>;
  start: DefaultValues<V>;
  send: (values: V) => Promise<unknown>;
}

export interface RequestForm<V extends FieldValues> {
  form: UseFormReturn<V>;
  submit: (event: React.FormEvent) => void;
  /** Wires a text field of the ui package: id, error and the native attributes. */
  field: (name: Path<V>) => { id: string; error: string | null } & ReturnType<UseFormReturn<V>['register']>;
  /** One line for each field that was refused, for the error summary. */
  problems: FieldProblem[];
  /** What was refused as a whole; stands above the button. */
  refusal: string | null;
  isSending: boolean;
}

const messagesOf = (errors: object): FieldProblem[] =>
  Object.entries(errors).flatMap(([name, error]: [string, { message?: string } | undefined]) =>
    name === 'root' || !error?.message ? [] : [{ fieldId: name, message: error.message }],
  );

/**
 * A form that sends one request of the contracts: checked on sending by the server's schema, and the server's own refusals
 * come back beside their fields. Nothing entered is lost.
 */
export function useRequestForm<V extends FieldValues>({ schema, start, send }: RequestFormOptions<V>): RequestForm<V> {
  const form = useForm<V>({
    resolver: zodResolver(schema),
    defaultValues: start,
    // On blur an error would vanish, and the button move away, under the pointer that presses it.
    reValidateMode: 'onSubmit',
    shouldFocusError: false,
  });
  const { errors, isSubmitting } = form.formState;

  const showRefusal = (error: unknown) => {
    const known = isApiError(error) ? error.fields.filter(({ path }) => path in form.getValues()) : [];
    for (const { path, message } of known) form.setError(path as Path<V>, { message });
    if (known.length === 0) form.setError('root', { message: (error as Error).message });
  };

  return {
    form,
    submit: (event) => void form.handleSubmit((values) => send(values).then(() => undefined, showRefusal))(event),
    field: (name) => ({
      ...form.register(name),
      id: name,
      error: messagesOf(errors).find(({ fieldId }) => fieldId === name)?.message ?? null,
    }),
    problems: messagesOf(errors),
    refusal: errors.root?.message ?? null,
    isSending: isSubmitting,
  };
}
