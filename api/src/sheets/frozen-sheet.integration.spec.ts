import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openStage, workAll, type Hands, type SheetStage } from '../testing/sheet-stage.js';
import { bindingOf, frozenTrouble, type FrozenSheet } from './frozen-sheet.js';

let stage: SheetStage;
let hands: Hands;
let frozen: FrozenSheet;
let hash: string;
beforeAll(async () => {
  stage = await openStage();
  hands = await stage.newSheet();
  await workAll(hands, stage);
  await hands.tomasz.sign('built').expect(200);
  await hands.imogen.sign('countersigned').expect(200);
  await hands.nell.sign('released').expect(200);
  const statement = 'SELECT frozen, content_hash AS hash FROM sheets WHERE id = $1';
  const [row] = await stage.app.db.sql<{ frozen: FrozenSheet; hash: string }>(
    stage.workshop.shop,
    statement,
    [hands.id],
  );
  ({ frozen, hash } = row!);
}, 120_000);
afterAll(() => stage.close());

type Path = readonly (string | number)[];

/** The paths of all plain values of a record. */
function leavesOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path];
  return Object.entries(value).flatMap(([key, child]) =>
    leavesOf(child, [...path, Array.isArray(value) ? Number(key) : key]),
  );
}

const at = (value: unknown, path: Path): unknown =>
  path.reduce((place, key) => (place as Record<string | number, unknown>)[key], value);

/** A copy of the frozen sheet with one value otherwise; undefined takes it away. */
function withValue(path: Path, value: unknown): FrozenSheet {
  const copy = structuredClone(frozen);
  const place = at(copy, path.slice(0, -1)) as Record<string | number, unknown>;
  const key = path.at(-1)!;
  if (value !== undefined) place[key] = value;
  else if (Array.isArray(place)) place.splice(Number(key), 1);
  else Reflect.deleteProperty(place, key);
  return copy;
}

describe('a frozen sheet', () => {
  it('holds as it was released', () => {
    expect(frozenTrouble(frozen, hash)).toBeNull();
  });

  it('shows any change of any value', () => {
    const leaves = leavesOf(frozen);
    expect(leaves.length).toBeGreaterThan(500);
    const values = fc.oneof(
      fc.string(),
      fc.integer(),
      fc.boolean(),
      fc.constant(null),
      fc.constant(undefined),
    );
    fc.assert(
      fc.property(fc.constantFrom(...leaves), values, (path, value) => {
        fc.pre(value !== at(frozen, path));
        expect(frozenTrouble(withValue(path, value), hash)).not.toBeNull();
      }),
      { numRuns: 400 },
    );
  });

  it('shows a ledger cut off at its tail, and a signature left out', () => {
    for (let cut = 1; cut < frozen.ledger.length; cut += 7) {
      const ledger = frozen.ledger.slice(0, -cut);
      expect(frozenTrouble({ ...frozen, ledger }, hash)).not.toBeNull();
    }
    for (const left of [0, 1, 2]) {
      const signatures = frozen.signatures.filter((_each, index) => index !== left);
      expect(frozenTrouble({ ...frozen, signatures }, hash)).not.toBeNull();
    }
  });

  it('shows another hash beside it', () => {
    expect(frozenTrouble(frozen, 'f'.repeat(64))).toBe(
      'The hash of the sheet is not the one that was released.',
    );
  });

  it('does not take a signature of another sheet', () => {
    const [built] = frozen.signatures;
    expect(bindingOf(frozen.content.id, built!)).toBe(built!.binding);
    expect(bindingOf('00000000-0000-4000-8000-000000000000', built!)).not.toBe(built!.binding);
  });
});

describe('verification', () => {
  const verify = async (): Promise<{ verdict: string; reason: string }> => {
    const { verificationCode } = (await hands.nell.sheet()).body;
    return (await stage.clients.nell.get(`/verifications/${verificationCode}`)).body;
  };
  /** Past the guards, as somebody with the database in their hands could. */
  const tamper = async (table: string, change: string): Promise<void> => {
    const statement = `DO $$ BEGIN ALTER TABLE ${table} DISABLE TRIGGER USER; UPDATE ${table} SET ${change};
      ALTER TABLE ${table} ENABLE TRIGGER USER; END $$`;
    await stage.app.db.sql(stage.workshop.shop, statement);
  };

  it('passes for what was released', async () => {
    expect(await verify()).toMatchObject({ verdict: 'pass' });
  });

  it.each([
    [
      'a frozen figure',
      'sheets',
      `frozen = replace(frozen::text, '0.045', '0.055')::jsonb`,
      `frozen = replace(frozen::text, '0.055', '0.045')::jsonb`,
    ],
    [
      'a ledger line',
      'ledger_lines',
      `body = replace(body, '0.045', '0.055')`,
      `body = replace(body, '0.055', '0.045')`,
    ],
    ['the hash', 'sheets', `content_hash = repeat('0', 64)`, null],
  ])('names it when somebody changed %s', async (_what, table, change, back) => {
    await tamper(table, change);
    const verdict = await verify();
    expect(verdict).toMatchObject({ verdict: 'fail' });
    expect(verdict.reason).toMatch(/^This record is not as it was released\. /);
    if (back !== null) {
      await tamper(table, back);
      expect(await verify()).toMatchObject({ verdict: 'pass' });
    }
  });
});
