import type { Source } from '../contracts/spec.js';

/** A source in words, as it stands beside a value: `Workshop manual 3rd ed., p. 2-11`. */
export function sourceText(source: Source | undefined): string {
  switch (source?.kind) {
    case undefined:
      return 'No source';
    case 'measured':
      return source.by === undefined ? 'Measured' : `Measured by ${source.by}`;
    case 'data-sheet':
      return `Maker's data sheet: ${source.document}`;
    case 'common-practice':
      return 'Common practice';
    case 'document': {
      const named = source.edition === undefined ? source.document : `${source.document} ${source.edition}`;
      return source.page === undefined ? named : `${named}, p. ${source.page}`;
    }
  }
}
