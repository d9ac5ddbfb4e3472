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
    ...{ shopName: 'Low Mill Motor Works', demo: true },
    address: `http://127.0.0.1:4300/workings/${entry.group}/${entry.key}`,
  };
}

const convert = workings.find(({ key }) => key === 'convert')!;
const questions = (text: string): number => text.split('?').length - 1;

describe('a working on paper', () => {
  it.each(workings.map((entry) => [entry.key, entry] as const))(
    'has every character of %s, and says on each page what it is not',
    async (_key, entry) => {
      const example = await exampleOf(entry);
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

  it('shows what was typed, what came of it, and where it comes from', async () => {
    const all = (await pagesOf(await renderWorking(await exampleOf(convert)))).join(' ');
    for (const words of ['27 lbf·ft', 'Figure with its unit', 'Worked out by', 'NIST SP 811', '1 Dec 2026']) {
      expect(all).toContain(words);
    }
  });

  it('names the car that it is kept with, and by whom', async () => {
    const kept = {
      ...{ title: 'Main caps', keptBy: 'Tomasz Brandt', keptAt: '2026-12-01T14:06:00.000Z' },
      ...{ carCode: 'LM-C01', carName: 'Aldwyn Tern 1.8' },
    };
    const all = (await pagesOf(await renderWorking({ ...(await exampleOf(convert)), kept }))).join(' ');
    expect(all).toContain(
      'Main caps. Kept with Aldwyn Tern 1.8, LM-C01, by Tomasz Brandt, 1 Dec 2026, 14:06 UTC.',
    );
  });

  it('puts an address that is too long for the foot on the last page in full', async () => {
    const address = `http://127.0.0.1:4300/workings/convert/convert?figure=${'1234567890'.repeat(40)}`;
    const pages = await pagesOf(await renderWorking({ ...(await exampleOf(convert)), address }));
    expect(pages[0]).toContain('(in full on the last page)');
    expect(pages.at(-1)?.replaceAll(/\s/g, '')).toContain(address);
  });

  it.each<Paper>(['a4', 'letter'])('is the same to the byte when it is made again on %s', async (paper) => {
    const example = await exampleOf(convert, paper);
    const [first, again] = [await renderWorking(example), await renderWorking(example)];
    expect(again.equals(first)).toBe(true);
  });
});
