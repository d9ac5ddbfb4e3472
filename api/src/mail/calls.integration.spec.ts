import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openStage, recordClearances, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
let unmailed: SheetStage;
beforeAll(async () => {
  stage = await openStage({ publicUrl: 'http://workshop.example:4300' });
  unmailed = await openStage({ mailFails: true });
});
afterAll(async () => {
  await stage.close();
  await unmailed.close();
});

describe('a call', () => {
  it('writes to the second person, with the step’s address and no figure', async () => {
    const hands = await stage.newSheet();
    await recordClearances(hands, stage.small, [0.04371, 0.04429]);
    const answer = await hands.tomasz.post('steps/1.2/calls', {});
    expect([answer.status, answer.body.mailed]).toEqual([200, true]);
    expect(answer.body.calls).toMatchObject([{ to: { name: 'Imogen Vale' } }]);
    const mail = stage.app.sent.at(-1);
    expect(mail?.to).toEqual({ name: 'Imogen Vale', address: 'imogen@lowmill.example' });
    expect(mail?.subject).toBe('Step 1.2 of Aldwyn Tern LM-C01 waits for you');
    expect(mail?.text).toContain(`http://workshop.example:4300/sheets/${hands.id}/steps/1.2`);
    expect(mail?.text).not.toMatch(/0\.04/);
    const again = await hands.tomasz.post('steps/1.2/calls', {});
    expect([again.status, again.body.detail]).toEqual([409, 'Imogen Vale was called a moment ago.']);
  });

  it('goes to somebody else where the second person recorded themselves', async () => {
    const hands = await stage.newSheet();
    const statement = 'UPDATE people SET role = $1 WHERE id = $2';
    await stage.app.db.sql(stage.workshop.shop, statement, ['builder', stage.ids.imogen]);
    await recordClearances({ ...hands, tomasz: hands.imogen }, stage.small);
    const answer = await hands.bea.post('steps/1.2/calls', {});
    expect(answer.body.calls).toMatchObject([{ to: { name: 'Tomasz Brandt' } }]);
    await stage.app.db.sql(stage.workshop.shop, statement, ['countersigner', stage.ids.imogen]);
  });

  it('stands when the mail cannot be sent, and says so', async () => {
    const hands = await unmailed.newSheet();
    await recordClearances(hands, unmailed.small);
    const answer = await hands.tomasz.post('steps/1.2/calls', {});
    expect([answer.status, answer.body.mailed]).toEqual([200, false]);
    expect(answer.body.calls).toHaveLength(1);
    expect((await hands.imogen.client.get('/bench')).body.items[0].sentence).toContain(
      'Tomasz Brandt called you.',
    );
  });

  it('waits until there is something to check', async () => {
    const hands = await stage.newSheet();
    await hands.tomasz.post('steps/1.2/calls', {}).expect(422);
  });
});
