import { describe, expect, it } from 'vitest';
import { workings } from '@second-spanner/shared/workings/registry';
import { typedLines } from '@second-spanner/shared/workings/working-text';
import type { Paper } from '../../paper/paper-size.js';
import { pagesOf } from '../../paper/testing/pages-of.js';
import { renderWorking } from './render.js';
import type { WorkingPaper } from './working-paper.js';

type Entry = (typeof workings)[number];

/** The worked example of a working, as it goes on paper. */
async function exampleOf(entry: Entry, paper: Paper = 'a4'): Promise<WorkingPaper> {
  const working = await entry.load();
  const { typed } = working.example;
  const { errors, missing, ...answer } = working.workOut(typed, { dialect: 'british' });
  expect({ errors, missing }).toEqual({ errors: {}, missing: null });
  return {
    ...answer,
    ...{ title: working.title, asks: working.asks, typed: typedLines(working, typed) },
    ...{ date: '2026-12-01T00:00:00.000Z', dialect: 'british', kept: null, paper },
    ...{ shopName: 'Low Mill Motor Works', demo: true, workedOutBy: 'Tomasz Brandt', begunFrom: '' },
    address: `http://127.0.0.1:4300/workings/${entry.group}/${entry.key}?${new URLSearchParams(typed).toString()}`,
  };
}

const convert = workings.find(({ key }) => key === 'convert')!;
const begunFrom = 'AT18, edition 2: head nuts';
const questions = (text: string): number => text.split('?').length - 1;

describe('a working on paper', () => {
  it.each(workings.map((entry) => [entry.key, entry] as const))(
    'has every character of %s, and says on each page what it is not',
    async (_key, entry) => {
      const address = `http://127.0.0.1:4300/workings/${entry.group}/${entry.key}`;
      const example = { ...(await exampleOf(entry)), address };
      const pages = await pagesOf(await renderWorking(example));
      pages.forEach((page, index) => {
        expect(page).toContain('A working without a sheet: it records nothing of any engine.');
        expect(page).toContain(`Page ${index + 1} of ${pages.length}`);
      });
      const all = pages.join(' ');
      expect(all).not.toMatch(/[{}]/);
      // A character that no face has would stand as a question mark beside those that are asked.
      expect(questions(all)).toBe(questions(JSON.stringify(example)));
    },
    20_000,
  );

  it.each(
    workings.flatMap((entry) =>
      (['a4', 'letter'] as const).map((paper) => [entry.key, paper, entry] as const),
    ),
  )(
    'has the example of %s on one page of %s, begun from a spec too',
    async (_key, paper, entry) => {
      const pdf = await renderWorking({ ...(await exampleOf(entry, paper)), begunFrom });
      expect(await pagesOf(pdf)).toHaveLength(1);
    },
    20_000,
  );

  it('says what it was begun from, who worked it out and when', async () => {
    const [page] = await pagesOf(await renderWorking({ ...(await exampleOf(convert)), begunFrom }));
    expect(page).toContain(begunFrom);
    expect(page).toContain('Worked out by Tomasz Brandt, 1 Dec 2026.');
  });

  it('has the cautions straight under the judgement', async () => {
    const judged = { kind: 'judgement', verdict: 'fail', reason: 'Two days are left.' } as const;
    const facts = { kind: 'facts', facts: [{ name: 'Ready', value: '4 Dec' }] } as const;
    const answer = { parts: [judged, facts], cautions: ['Leave it warm.'] };
    const [page] = await pagesOf(await renderWorking({ ...(await exampleOf(convert)), ...answer }));
    expect(page).toContain('Fail Two days are left. Take care Leave it warm. Ready 4 Dec');
  });

  it.each([
    [{ waits: true }, 'Waiting'],
    [{ word: 'Wait until 08:00' }, 'Wait until 08:00'],
    [{ waits: true, word: 'A judgement with many words to it' }, 'A judgement with many words to it'],
  ] as const)('gives a judgement with %j its word', async (own, word) => {
    const judged = { kind: 'judgement', verdict: 'fail', reason: 'Two days are left.', ...own } as const;
    const [page] = await pagesOf(await renderWorking({ ...(await exampleOf(convert)), parts: [judged] }));
    expect(page).toContain(`${word} Two days are left.`);
    expect(page).not.toContain('Fail');
  });

  it('shows what was typed, what came of it, and where it comes from', async () => {
    const all = (await pagesOf(await renderWorking(await exampleOf(convert)))).join(' ');
    for (const words of ['27 lbf·ft', 'Figure with its unit', 'Worked out by', 'NIST SP 811', '1 Dec 2026']) {
      expect(all).toContain(words);
    }
  });

  it('names the car that it is kept with, and by whom', async () => {
    const kept = {
      ...{ title: 'Main caps', keptAt: '2026-12-01T14:06:00.000Z' },
      ...{ carCode: 'LM-C01', carName: 'Aldwyn Tern 1.8' },
    };
    const all = (await pagesOf(await renderWorking({ ...(await exampleOf(convert)), kept }))).join(' ');
    expect(all).toContain(
      'Main caps. Kept with Aldwyn Tern 1.8, LM-C01, by Tomasz Brandt, 1 Dec 2026, 14:06 UTC.',
    );
  });

  it.each([300, 800, 18_000])('makes no page for an address of %i characters', async (length) => {
    const address = `http://127.0.0.1:4300/workings/convert/convert?figure=${'1'.repeat(length)}`;
    const pages = await pagesOf(await renderWorking({ ...(await exampleOf(convert)), address }));
    expect(pages).toHaveLength(1);
    expect(pages[0]).toContain('http://127.0.0.1:4300/workings/convert/convert, with what was typed above');
  });

  it('goes on to further pages when a case is long', async () => {
    const rows = Array.from({ length: 90 }, (_, index) => [`${index + 1}`, 'as measured']);
    const readings = {
      kind: 'table',
      heading: 'Readings',
      columns: [{ name: 'No.' }, { name: 'How' }],
      rows,
    } as const;
    const pages = await pagesOf(await renderWorking({ ...(await exampleOf(convert)), parts: [readings] }));
    expect(pages.length).toBeGreaterThan(1);
    expect(pages.join(' ')).toContain('90 as measured');
  });

  it.each<Paper>(['a4', 'letter'])('is the same to the byte when it is made again on %s', async (paper) => {
    const example = await exampleOf(convert, paper);
    const [first, again] = [await renderWorking(example), await renderWorking(example)];
    expect(again.equals(first)).toBe(true);
  });
});
