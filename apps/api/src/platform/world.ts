import type { DataSource } from 'typeorm';
import type { Settings } from '../settings.ts';
import type { FileStore } from './files.ts';
import type { Log } from './log.ts';
import type { Mailer } from './mail.ts';
import type { PaymentGateway } from './payments.ts';
import type { PriceSource } from './prices.ts';
import type { Sessions } from './session.ts';

/** Everything outside the process, and what stands for it in tests. Features take the parts they need. */
export interface World {
  settings: Settings;
  db: DataSource;
  log: Log;
  sessions: Sessions;
  mail: Mailer;
  prices: PriceSource;
  files: FileStore;
  payments: PaymentGateway;
}
