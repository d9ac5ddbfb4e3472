import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { describe, expect, it } from 'vitest';
import { renderBuildSheet } from './render.js';
import { sampleBuildSheet } from './testing/sample-build-sheet.js';

async function pagesOf(pdf: Buffer): Promise<readonly string[]> {
  const document = await getDocument({ data: new Uint8Array(pdf), useSystemFonts: false, verbosity: 0 })
    .promise;
  const pages: string[] = [];
  for (let page = 1; page <= document.numPages; page += 1) {
    const { items } = await (await document.getPage(page)).getTextContent();
    pages.push(items.map((item) => ('str' in item ? item.str : '')).join(' '));
  }
  return pages;
}

describe('a build sheet', () => {
  it('tells the car, the steps, their readings and people, in text that can be found', async () => {
    const pages = await pagesOf(await renderBuildSheet(sampleBuildSheet('released')));
    const all = pages.join(' ');
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

  it('bears the code to verify it and its number of pages on every page', async () => {
    const pages = await pagesOf(await renderBuildSheet(sampleBuildSheet('released')));
    pages.forEach((page, index) => {
      expect(page).toContain('7K3F-Q9TD');
      expect(page).toContain(`Page ${index + 1} of ${pages.length}`);
      expect(page).not.toContain('Running sheet');
    });
  });

  it('says on every page of a running sheet that it is one', async () => {
    const pages = await pagesOf(await renderBuildSheet(sampleBuildSheet('on-the-stand', 'letter')));
    for (const page of pages) expect(page).toContain('Running sheet, not signed');
  });

  it('is the same to the byte when it is made again', async () => {
    const first = await renderBuildSheet(sampleBuildSheet('released'));
    const again = await renderBuildSheet(sampleBuildSheet('released'));
    expect(again.equals(first)).toBe(true);
  });

  it('gives a covered step no figure', async () => {
    const sample = sampleBuildSheet('on-the-stand');
    const steps = sample.steps.map((step) =>
      step.title === 'Crankshaft {end float}'
        ? { ...step, covered: true, entries: [], countersignatures: [] }
        : step,
    );
    const all = (await pagesOf(await renderBuildSheet({ ...sample, steps }))).join(' ');
    expect(all).toContain('The first reading is covered until the second is in.');
  });
});
