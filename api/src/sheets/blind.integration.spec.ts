import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { EntryContent, SecondReadingContent } from '@second-spanner/shared/contracts/steps';
import { scenes } from '../testing/sheet-scenes.js';
import { openStage, recordClearances, type Hands, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
beforeAll(async () => {
  stage = await openStage();
});
afterAll(() => stage.close());

/** Everything of a sheet that a person can read, as one text. */
async function everythingFor(
  hands: Hands,
  name: 'imogen' | 'nell' | 'bea' | 'ravi',
  code: string,
): Promise<string> {
  const { client, id } = hands[name];
  const paths = [
    `/sheets/${id}`,
    `/sheets/${id}/steps/${code}`,
    `/sheets/${id}/history?limit=200`,
    `/sheets/${id}/snags`,
    '/bench',
    '/sheets',
    `/cars/${stage.workshop.cars.ravis}`,
  ];
  const answers = await Promise.all(paths.map((path) => client.get(path).expect(200)));
  return answers.map(({ text }) => text).join('\n');
}

describe('the first figures of a step', () => {
  // Odd figures, so that they cannot stand anywhere by chance. The second of the two is over the limit of 0.065.
  const first = 0.04371;
  const tooWide = 0.09137;
  const corrected = 0.05219;
  const figures = ['0.04371', '0.0437', '0.09137', '0.0914', '0.05219', '0.0522'];
  const words = ['wobbled on a hair', '"verdict":"fail"', '"verdict":"pass"', 'over the limit', 'inside'];

  it('stand nowhere in what others can read until their own reading is in', async () => {
    const hands = await stage.newSheet();
    const { tools } = stage.small;
    const { tomasz, imogen } = hands;
    await tomasz.record('1.1', scenes.check()).expect(201);
    await tomasz.record('1.2', scenes.clearance(tools, 'Main 1', first)).expect(201);
    const failed = await tomasz.record('1.2', scenes.clearance(tools, 'Main 2', tooWide)).expect(201);
    const wrong = failed.body.entries.at(-1);
    expect(wrong.verdict).toBe('fail');
    for (const name of ['imogen', 'bea', 'ravi'] as const) {
      const text = withoutOtherSteps(await everythingFor(hands, name, '1.2'));
      for (const part of [...figures, ...words]) expect(text, `${name}: ${part}`).not.toContain(part);
    }
    // The foreman must decide on the failed reading, so sees that one, while it is open, and no other.
    const nells = withoutOtherSteps(await everythingFor(hands, 'nell', '1.2'));
    expect(nells).toContain('0.09137');
    for (const part of ['0.04371', '0.0437', '"entries":[{']) expect(nells).not.toContain(part);
    const correction = { replaces: wrong.id, reason: 'The gauge wobbled on a hair.' };
    await tomasz.record('1.2', scenes.clearance(tools, 'Main 2', corrected), correction).expect(201);
    for (const name of ['imogen', 'nell', 'bea', 'ravi'] as const) {
      const text = withoutOtherSteps(await everythingFor(hands, name, '1.2'));
      for (const part of [...figures, ...words]) expect(text, `${name}: ${part}`).not.toContain(part);
      expect(text).toContain('"covered":true');
    }
    // The same words do stand in what the builder reads: the check above can fail.
    const own = [await tomasz.step('1.2'), await tomasz.client.get(`/sheets/${hands.id}/history`)];
    const ownText = own.map(({ text }) => text).join();
    for (const part of ['0.04371', '0.09137', '0.05219', 'wobbled on a hair', '"verdict":"fail"']) {
      expect(ownText).toContain(part);
    }
    const read = await imogen.readAgain('1.2', scenes.clearanceAgain(tools, 0.0438, 0.0523)).expect(201);
    expect(read.body).toMatchObject({ covered: false });
    expect(read.body.entries).toHaveLength(3);
    expect(read.text).toContain('0.04371');
    // For everybody else they stay covered until the step is countersigned.
    expect(await everythingFor(hands, 'nell', '1.2')).not.toContain('0.04371');
    await imogen.countersign('1.2').expect(201);
    expect(await everythingFor(hands, 'nell', '1.2')).toContain('0.04371');
  });

  it('stay out of what a refusal says', async () => {
    const hands = await stage.newSheet();
    const { tools } = stage.small;
    await recordClearances(hands, stage.small, [first, corrected]);
    const sameTool: SecondReadingContent = {
      ...{ kind: 'measured-again', toolId: tools['T-02'] },
      readings: [
        { at: 'Main 1', value: { value: 0.044, unit: 'mm' } },
        { at: 'Main 2', value: { value: 0.052, unit: 'mm' } },
      ],
    };
    const refused = await hands.imogen.readAgain('1.2', sameTool);
    expect(refused.status).toBe(400);
    expect(refused.body.errors[0].field).toBe('content.toolId');
    for (const figure of figures) expect(refused.text).not.toContain(figure);
    const taken: EntryContent = scenes.clearance(tools, 'Main 1', 0.05);
    const conflict = await hands.bea.record('1.2', taken);
    expect(conflict.status).toBe(409);
    for (const figure of figures) expect(conflict.text).not.toContain(figure);
  });

  it('hold the setting of a wrench, and leads as they stand, too', async () => {
    const hands = await stage.newSheet();
    const { tools } = stage.small;
    const { tomasz, imogen } = hands;
    await recordClearances(hands, stage.small);
    await imogen.readAgain('1.2', scenes.clearanceAgain(tools, 0.045, 0.044)).expect(201);
    await imogen.countersign('1.2').expect(201);
    await tomasz.record('1.3', scenes.pull(tools, 1, '1', 30)).expect(201);
    const step = await imogen.step('1.3');
    expect(step.body).toMatchObject({ covered: true, entries: [], secondReadings: [] });
    expect((await imogen.client.get(`/sheets/${hands.id}/history`)).text).not.toContain('set to 30');
  });
});

/** Step 1.1 is not critical: its verdict is nobody's secret. */
function withoutOtherSteps(text: string): string {
  return text.replace(/\{[^{}]*(\{[^{}]*\}[^{}]*)*"stepCode":"1\.1"[^{}]*\}/g, '');
}
