import 'reflect-metadata';
import { DataSource, type LoggerOptions } from 'typeorm';
import { entities } from './entities.ts';
import { CreateMarket } from './migrations/1765000000001-create-market.ts';

export const migrations = [CreateMarket];

interface SourceOptions {
  /** The market's zone and currency; each connection knows them, see platform/market-terms.ts. */
  zone: string;
  currency: string;
  poolSize?: number;
  logging?: LoggerOptions;
}

/**
 * The connection of the API and the worker. Their role may read and write rows but owns nothing:
 * migrations run with `createOwnerSource`.
 */
export const createDataSource = (
  url: string,
  { zone, currency, poolSize = 12, logging = false }: SourceOptions,
): DataSource =>
  new DataSource({
    type: 'postgres',
    url,
    entities,
    synchronize: false,
    logging,
    poolSize,
    installExtensions: false,
    extra: {
      application_name: 'lydite',
      options: `-c timezone=${zone} -c lydite.currency=${currency}`,
      connectionTimeoutMillis: 10_000,
      statement_timeout: 15_000,
      lock_timeout: 10_000,
      idle_in_transaction_session_timeout: 30_000,
    },
  });

export const createOwnerSource = (url: string): DataSource =>
  new DataSource({
    type: 'postgres',
    url,
    migrations,
    migrationsTransactionMode: 'each',
    synchronize: false,
    logging: false,
    poolSize: 2,
    installExtensions: false,
  });
