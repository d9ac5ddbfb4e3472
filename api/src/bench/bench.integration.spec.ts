import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { BenchItem } from '@second-spanner/shared/contracts/sheets';
import { scenes } from '../testing/sheet-scenes.js';
import { openStage, recordClearances, workAll, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
beforeAll(async () => {
  stage = await openStage();
});
afterAll(() => stage.close());

type Name = 'nell' | 'tomasz' | 'imogen' | 'bea' | 'ravi' | 'oona' | 'hana';

const itemsOf = async (name: Name, sheetId: string): Promise<string[]> => {
  const { body } = await stage.clients[name].get('/bench').expect(200);
  return (body.items as BenchItem[])
    .filter((item) => item.sheetId === sheetId)
    .map(({ kind, stepCode }) => (stepCode === null ? kind : `${kind} ${stepCode}`));
};

describe('the bench', () => {
  it('shows each person what waits for them as the sheet goes on', async () => {
    const hands = await stage.newSheet();
    const of = (name: Name): Promise<string[]> => itemsOf(name, hands.id);
    expect(await of('tomasz')).toEqual(['next-step 1.1']);
    expect(await of('imogen')).toEqual([]);
    await recordClearances(hands, stage.small);
    expect(await of('imogen')).toEqual(['second-check 1.2']);
    expect(await of('nell')).toEqual(['second-check 1.2']);
    expect(await of('bea')).toEqual([]);
    expect(await of('tomasz')).toEqual(['next-step']);
    await hands.imogen.readAgain('1.2', scenes.clearanceAgain(stage.small.tools, 0.06, 0.044)).expect(201);
    expect(await of('nell')).toEqual(['snag 1.2']);
    expect(await of('imogen')).toEqual([]);
    // One of the two who disagree: it does not wait for him.
    expect(await of('tomasz')).toEqual(['next-step']);
    expect(await of('hana')).toEqual([]);
    expect(await of('ravi')).toEqual([]);
  });

  it('shows who is called that they are', async () => {
    const hands = await stage.newSheet();
    await recordClearances(hands, stage.small);
    await hands.tomasz.post('steps/1.2/calls', {}).expect(200);
    const { body } = await stage.clients.imogen.get('/bench');
    const item = (body.items as BenchItem[]).find(({ sheetId }) => sheetId === hands.id);
    expect(item?.sentence).toBe(
      'Tomasz Brandt called you. Recorded, and waits for a second person: measured again.',
    );
  });

  it('shows what is to be signed, released and read', async () => {
    const hands = await stage.newSheet();
    const of = (name: Name): Promise<string[]> => itemsOf(name, hands.id);
    await workAll(hands, stage);
    expect(await of('tomasz')).toEqual(['sign']);
    await hands.tomasz.sign('built').expect(200);
    expect([await of('tomasz'), await of('imogen'), await of('nell')]).toEqual([[], ['sign'], []]);
    await hands.imogen.sign('countersigned').expect(200);
    expect([await of('imogen'), await of('nell')]).toEqual([[], ['release']]);
    await hands.nell.sign('released').expect(200);
    expect([await of('nell'), await of('ravi'), await of('oona')]).toEqual([[], ['read'], []]);
  });

  it('shows the sheets on the stand, to an owner only those of their cars', async () => {
    const count = async (name: Name): Promise<number> =>
      (await stage.clients[name].get('/bench')).body.onTheStand.length;
    expect(await count('nell')).toBe(2);
    expect([await count('ravi'), await count('oona'), await count('hana')]).toEqual([2, 0, 0]);
  });
});
