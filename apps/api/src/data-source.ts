import 'reflect-metadata';
import { DataSource, type LoggerOptions } from 'typeorm';
import { entities } from './entities.ts';
import { CreateMarket } from './migrations/1765000000001-create-market.ts';

export const migrations = [CreateMarket];

/**
 * The connection of the API and the worker. Their role may read and write rows but owns nothing:
 * migrations run with `createOwnerSource`.
 */
export const createDataSource = (url: string, { poolSize = 12, logging = false as LoggerOptions } = {}): DataSource =>
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
