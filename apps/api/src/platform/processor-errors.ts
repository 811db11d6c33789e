import Stripe from 'stripe';
import { AppError } from './app-error.ts';
import { ProcessorFailure, ProcessorRefusal } from './payments.ts';

const { errors } = Stripe;

/** The processor's client's error in the market's words; a wrong key or a missing right stays as it is, for the log. */
export function translated(error: unknown): unknown {
  if (!(error instanceof errors.StripeError)) return error;
  if (error.statusCode !== undefined && error.statusCode >= 500) return new ProcessorFailure(error);
  if (
    error instanceof errors.StripeConnectionError ||
    error instanceof errors.StripeRateLimitError ||
    error.statusCode === 409
  )
    return new AppError(
      'processor.unavailable',
      'The payment processor does not answer. Nothing was changed; try again in a minute.',
      { cause: error },
    );
  if (error instanceof errors.StripeAuthenticationError || error instanceof errors.StripePermissionError) return error;
  return new ProcessorRefusal(error.code ?? error.rawType ?? 'unknown', error.message, error);
}

export const asked = <T>(call: Promise<T>): Promise<T> =>
  call.catch((error: unknown) => {
    throw translated(error);
  });

/** A list of the processor, newest first, turned round. */
export async function* oldestFirst<T>(list: AsyncIterable<T>): AsyncIterable<T> {
  const all: T[] = [];
  try {
    for await (const one of list) all.push(one);
  } catch (error) {
    throw translated(error);
  }
  yield* all.toReversed();
}
