import type { Settings } from '../settings.ts';
import type { PaymentGateway } from './payments.ts';

export function createProcessorGateway(
  _settings: Pick<Settings, 'PAYMENTS_SECRET_KEY' | 'PAYMENTS_API_URL' | 'PAYMENTS_WEBHOOK_SECRETS'>,
): PaymentGateway {
  throw new Error('not built yet');
}
