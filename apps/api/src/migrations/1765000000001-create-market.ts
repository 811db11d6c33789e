import type { MigrationInterface, QueryRunner } from 'typeorm';
import { lotsSchema } from './schema-2-lots.sql.ts';
import { moneySchema } from './schema-3-money.sql.ts';
import { peopleSchema } from './schema-1-people.sql.ts';

export class CreateMarket implements MigrationInterface {
  name = 'CreateMarket1765000000001';

  async up(runner: QueryRunner): Promise<void> {
    for (const schema of [peopleSchema, lotsSchema, moneySchema]) await runner.query(schema);
  }

  /** Back to an empty schema. `drop owned` spares the migrations table, which the runner keeps. */
  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      do $$ declare t record; begin
        for t in select tablename from pg_tables where schemaname = 'public' and tablename <> 'migrations' loop
          execute format('drop table if exists public.%I cascade', t.tablename);
        end loop;
      end $$;
      drop sequence if exists lot_codes, deal_codes;
      drop function if exists market_now, ledger_post_entry, ledger_check_balanced, refuse_change;
    `);
  }
}
