import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';

/** The text of each page of a PDF, one space between words. */
export async function pagesOf(pdf: Uint8Array): Promise<readonly string[]> {
  const document = await getDocument({ data: new Uint8Array(pdf), useSystemFonts: false, verbosity: 0 })
    .promise;
  const pages: string[] = [];
  for (let page = 1; page <= document.numPages; page += 1) {
    const { items } = await (await document.getPage(page)).getTextContent();
    const words = items.map((item) => ('str' in item ? item.str : '')).join(' ');
    pages.push(words.replaceAll(/\s+/g, ' '));
  }
  return pages;
}
