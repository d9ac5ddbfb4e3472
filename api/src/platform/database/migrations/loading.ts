import type { MigrationInterface, QueryRunner } from 'typeorm';

/** A mark that stands while the demo is being loaded; found at a start, it says that the loading was cut off. */
export class Loading1764547200011 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query('CREATE TABLE loading (since timestamptz NOT NULL)');
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE loading');
  }
}
