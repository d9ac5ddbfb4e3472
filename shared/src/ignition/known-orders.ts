/** A firing order that engines with so many cylinders are built with. */
export interface KnownOrder {
  readonly order: readonly number[];
  /** What kind of engine it is known from. */
  readonly engine: string;
  /** Where the order is printed, or that it is common practice without a source. */
  readonly source: string;
}

const article2010 = 'article "Firing order", encyclopedia copy of 2010';
const articleOlder = 'article "Firing order", older encyclopedia copy';
const handbook = 'FAA aviation maintenance handbook, passage on firing orders';
const textbook = 'Halderman & Linder, Automotive Fuel and Emissions Control Systems, p. 361';
const vEights = 'article on the firing orders of V8 engines';
const practice = 'common practice, no source';
const fromMemory = 'from memory, no source';

/**
 * Firing orders by number of cylinders, each beginning with cylinder 1. A wiring that follows one of these
 * in place of the engine's own was probably copied from another engine.
 */
export const knownOrders: Readonly<Record<number, readonly KnownOrder[]>> = {
  2: [{ order: [1, 2], engine: 'twin', source: practice }],
  3: [
    { order: [1, 2, 3], engine: 'in-line three', source: article2010 },
    { order: [1, 3, 2], engine: 'in-line three', source: articleOlder },
  ],
  4: [
    { order: [1, 3, 4, 2], engine: 'in-line four', source: article2010 },
    { order: [1, 2, 4, 3], engine: 'in-line four', source: practice },
    { order: [1, 4, 3, 2], engine: 'flat four', source: fromMemory },
    { order: [1, 4, 2, 3], engine: 'flat four, aircraft numbering', source: handbook },
    { order: [1, 3, 2, 4], engine: 'flat four', source: practice },
  ],
  5: [
    { order: [1, 2, 4, 5, 3], engine: 'in-line five', source: article2010 },
    { order: [1, 3, 5, 2, 4], engine: 'five-cylinder radial', source: practice },
  ],
  6: [
    { order: [1, 5, 3, 6, 2, 4], engine: 'in-line six', source: article2010 },
    { order: [1, 4, 2, 6, 3, 5], engine: 'in-line six, the other hand of crank', source: practice },
    { order: [1, 6, 5, 4, 3, 2], engine: 'V6', source: textbook },
    { order: [1, 2, 3, 4, 5, 6], engine: 'V6', source: practice },
    { order: [1, 4, 2, 5, 3, 6], engine: 'V6', source: practice },
    { order: [1, 4, 3, 6, 2, 5], engine: 'V6', source: fromMemory },
    { order: [1, 6, 3, 5, 2, 4], engine: 'V6', source: fromMemory },
    {
      order: [1, 6, 2, 4, 3, 5],
      engine: 'flat six',
      source: 'article "Firing order", copy of its six-cylinder list',
    },
    { order: [1, 4, 5, 2, 3, 6], engine: 'flat six, aircraft numbering', source: handbook },
  ],
  7: [{ order: [1, 3, 5, 7, 2, 4, 6], engine: 'seven-cylinder radial', source: article2010 }],
  8: [
    { order: [1, 8, 4, 3, 6, 5, 7, 2], engine: 'V8', source: vEights },
    { order: [1, 8, 7, 2, 6, 5, 4, 3], engine: 'V8', source: vEights },
    { order: [1, 5, 4, 2, 6, 3, 7, 8], engine: 'V8', source: vEights },
    {
      order: [1, 3, 7, 2, 6, 5, 4, 8],
      engine: 'V8',
      source: 'article on numbering the cylinders of V engines',
    },
    { order: [1, 5, 4, 8, 6, 3, 7, 2], engine: 'V8', source: practice },
    { order: [1, 5, 6, 3, 4, 2, 7, 8], engine: 'V8', source: practice },
    { order: [1, 6, 2, 5, 8, 3, 7, 4], engine: 'in-line eight', source: practice },
    { order: [1, 5, 3, 7, 4, 8, 2, 6], engine: 'flat-crank V8', source: fromMemory },
  ],
  9: [{ order: [1, 3, 5, 7, 9, 2, 4, 6, 8], engine: 'nine-cylinder radial', source: practice }],
  10: [{ order: [1, 10, 9, 4, 3, 6, 5, 8, 7, 2], engine: 'V10', source: article2010 }],
  12: [
    { order: [1, 7, 5, 11, 3, 9, 6, 12, 2, 8, 4, 10], engine: 'V12', source: article2010 },
    { order: [1, 12, 5, 8, 3, 10, 6, 7, 2, 11, 4, 9], engine: 'V12', source: practice },
  ],
};
