import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The second wall between shops: a connection sees the rows of the shop it is set to, and no others. */
export class RowSecurity1764547200009 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    for (const table of ofShop) {
      await runner.query(`
        ALTER TABLE ${table} ENABLE ROW LEVEL SECURITY;
        ALTER TABLE ${table} FORCE ROW LEVEL SECURITY;
        CREATE POLICY own_shop ON ${table} USING (shop_id = current_shop());`);
    }
    await runner.query(`
      ALTER TABLE shops ENABLE ROW LEVEL SECURITY;
      ALTER TABLE shops FORCE ROW LEVEL SECURITY;
      CREATE POLICY own_shop ON shops USING (id = current_shop());
      CREATE POLICY setup ON shops FOR SELECT
        USING (current_setting('second_spanner.setup', true) = 'yes');
      CREATE POLICY sign_in ON people FOR SELECT
        USING (email = current_setting('second_spanner.sign_in', true));
      CREATE POLICY verification ON sheets FOR SELECT
        USING (verification_code = current_setting('second_spanner.verification', true));
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP POLICY sign_in ON people; DROP POLICY verification ON sheets');
    await runner.query('DROP POLICY setup ON shops');
    for (const table of [...ofShop, 'shops']) {
      await runner.query(`
        DROP POLICY own_shop ON ${table};
        ALTER TABLE ${table} NO FORCE ROW LEVEL SECURITY;
        ALTER TABLE ${table} DISABLE ROW LEVEL SECURITY;`);
    }
  }
}

const ofShop = [
  'people',
  'sessions',
  'cars',
  'tools',
  'files',
  'specs',
  'spec_editions',
  'sheets',
  'steps',
  'entries',
  'second_readings',
  'countersignatures',
  'snags',
  'snag_settlements',
  'calls',
  'signatures',
  'ledger_lines',
];
