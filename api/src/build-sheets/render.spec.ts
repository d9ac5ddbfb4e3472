import { beforeAll, describe, expect, it, vi } from 'vitest';
import { pagesOf } from '../paper/testing/pages-of.js';
import { renderBuildSheet } from './render.js';
import { sampleBuildSheet } from './testing/sample-build-sheet.js';

describe('a build sheet', () => {
  let released: Buffer;
  let releasedPages: readonly string[];
  let running: Buffer;

  beforeAll(async () => {
    released = await renderBuildSheet(sampleBuildSheet('released'));
    releasedPages = await pagesOf(released);
    running = await renderBuildSheet(sampleBuildSheet('on-the-stand', 'letter'));
  }, 30_000);

  it('tells the car, the steps, their readings and people, in text that can be found', () => {
    const all = releasedPages.join(' ');
    for (const words of [
      'Aldwyn Tern 1.8',
      'AT18-20417',
      'Ravi Lindqvist',
      'Tighten the head nuts',
      'T. Brandt',
      'I. Vale',
      'anticlockwise',
    ]) {
      expect(all).toContain(words);
    }
    expect(all).not.toMatch(/[{}]/);
    expect(all).not.toContain('?');
  });

  it('bears the code to verify it and its number of pages on every page', () => {
    releasedPages.forEach((page, index) => {
      expect(page).toContain('7K3F-Q9TD');
      expect(page).toContain(`Page ${index + 1} of ${releasedPages.length}`);
      expect(page).not.toContain('Running sheet');
    });
  });

  it('says on every page of a running sheet that it is one', async () => {
    for (const page of await pagesOf(running)) expect(page).toContain('Running sheet, not signed');
  });

  it('is the same to the byte when it is made again, whatever was printed before', async () => {
    vi.resetModules();
    const { renderBuildSheet: afresh } = await import('./render.js');
    const sample = sampleBuildSheet('released');
    // The Á brings the glyph of an A along, which is not to stay without its character.
    const sheet = { ...sample.sheet, engineNumber: 'Á-1' };
    await afresh({ ...sample, sheet, steps: sample.steps.slice(0, 5) });
    const again = await afresh(sample);
    expect(again.equals(released)).toBe(true);
  }, 20_000);

  it('gives a covered step no figure', async () => {
    const sample = sampleBuildSheet('on-the-stand');
    const steps = sample.steps
      .filter(({ title }) => title === 'Crankshaft {end float}')
      .map((step) => ({ ...step, covered: true, entries: [], countersignatures: [] }));
    expect(steps).toHaveLength(1);
    const all = (await pagesOf(await renderBuildSheet({ ...sample, steps }))).join(' ');
    expect(all).toContain('The first reading is covered until the second is in.');
  });
});
