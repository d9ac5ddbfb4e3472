import { signatureWords } from '@second-spanner/shared/sheet/words';
import { signatureMeanings } from '@second-spanner/shared/contracts/sheets';
import type { BuildSheet } from '../build-sheet.js';
import type { Pages } from '../../paper/page.js';
import { stamp } from '../../paper/stamp.js';

const height = 58;

/** Who signed, what for, and the hash that each signature binds. */
export function signatures(pages: Pages, { sheet }: BuildSheet): void {
  pages.need(height + 60);
  pages.y += 6;
  pages.y += pages.text('Signatures', pages.left, pages.y, { font: 'text-strong', size: 12 }) + 6;
  const width = pages.width / signatureMeanings.length;
  pages.document.lineWidth(1.2).rect(pages.left, pages.y, pages.width, height).stroke('#000000');
  signatureMeanings.forEach((meaning, index) => {
    const x = pages.left + index * width;
    if (index > 0)
      pages.document
        .lineWidth(0.8)
        .moveTo(x, pages.y)
        .lineTo(x, pages.y + height)
        .stroke('#000000');
    const signed = sheet.signatures.find((signature) => signature.meaning === meaning);
    const style = { width: width - 16 };
    pages.text(signatureWords[meaning], x + 9, pages.y + 7, { ...style, font: 'plate', size: 8.5 });
    pages.text(signed?.person.name ?? 'not signed', x + 9, pages.y + 19, {
      ...style,
      font: 'text-medium',
      size: 12,
    });
    if (signed) {
      pages.text(`signed ${stamp(signed.at)}`, x + 9, pages.y + 35, { ...style, size: 8.5 });
      pages.text(signed.binding.slice(0, 24), x + 9, pages.y + 46, { ...style, font: 'figures', size: 7 });
    }
  });
  pages.y += height + 6;
  if (sheet.contentHash) {
    pages.paragraph('Hash of the sheet that was signed (SHA-256 over its canonical record):', { size: 8 });
    pages.paragraph(sheet.contentHash, { font: 'figures', size: 8 });
  }
}
