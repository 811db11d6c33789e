import type { Stripe } from 'stripe';

/** Metadata sent on an update is added; an empty value removes its key. */
export function mergeMetadata(
  before: Stripe.Metadata | null,
  sent: Record<string, string> | undefined,
): Stripe.Metadata {
  const merged = { ...before, ...sent };
  return Object.fromEntries(Object.entries(merged).filter(([, value]) => value !== ''));
}
