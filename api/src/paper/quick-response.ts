import { encode } from 'uqr';

/** Dark modules side by side in one row, in shares of the code's side. */
export interface Run {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** The dark runs of the code that says a text. */
export function runsOf(text: string): readonly Run[] {
  const { size, data } = encode(text, { border: 0 });
  const module = 1 / size;
  return data.flatMap((row, y) =>
    row.flatMap((dark, x) => {
      if (!dark || row[x - 1]) return [];
      const end = row.indexOf(false, x);
      const length = (end < 0 ? size : end) - x;
      return [{ x: x * module, y: y * module, width: length * module, height: module }];
    }),
  );
}

/** Draws a code with its top left corner at a point. */
export function drawCode(
  document: PDFKit.PDFDocument,
  runs: readonly Run[],
  x: number,
  y: number,
  side: number,
): void {
  for (const run of runs) {
    document.rect(x + run.x * side, y + run.y * side, run.width * side, run.height * side);
  }
  document.fill('#000000');
}
