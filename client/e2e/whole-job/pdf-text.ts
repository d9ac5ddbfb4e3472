import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';

/** The text of a PDF, a page each, as a reader would find it. */
export async function pdfText(pdf: Uint8Array): Promise<readonly string[]> {
  const document = await getDocument({ data: new Uint8Array(pdf), useSystemFonts: false, verbosity: 0 })
    .promise;
  const pages: string[] = [];
  for (let page = 1; page <= document.numPages; page += 1) {
    const { items } = await (await document.getPage(page)).getTextContent();
    const words = items.map((item) => ('str' in item ? item.str : ''));
    pages.push(words.join(' ').replace(/\s+/g, ' '));
  }
  return pages;
}
