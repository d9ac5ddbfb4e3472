import type { ComparePartsRequest, SizeLimits } from '../../contracts/fits.js';
import { InputError } from '../../contracts/input-error.js';
import type { KeySpec } from '../../contracts/spec.js';
import { compareParts } from '../../fits/compare-parts.js';
import { requireLimits } from '../../fits/require-limits.js';
import { defineWorking } from '../define-working.js';
import type { CaseReader } from '../read-case.js';
import { writeRows } from '../rows.js';
import type { CellField, WorkingCase } from '../working.js';
import { compareSections, dimensionColumns } from './compare-fields.js';
import { printedLength } from './printed-length.js';
import { typedLimits } from './spec-limits.js';

/** One maker's part in the place of another's. */
export const comparePartsWorking = defineWorking({
  key: 'compare-parts',
  group: 'fits-and-keys',
  title: 'One part for another',
  asks: 'Will this part do in the place of that one, dimension by dimension?',
  sections: compareSections,
  example: {
    typed: {
      originalName: 'British pulley, 1 in shaft',
      otherName: 'Metric pulley, 25.4 mm shaft',
      dimensions: rowsOf([
        {
          dimension: 'width of the slot',
          originalLow: '0.250 in',
          originalHigh: '0.251 in',
          otherLow: '7.964 mm',
          otherHigh: '8 mm',
        },
      ]),
    },
    from: 'BS 46:Part 1:1958, hub slot of the 1/4 in key, and DIN 6885-1, 8 mm slot N9 (ISO 286-2)',
  },
  fromSpec: ({ keys }) =>
    keys.map((key) => ({ name: `Another hub for the ${key.name}`, typed: typedHub(key) })),
  basis: [
    'Side by side: all of the other’s sizes within the original’s pass, none of them fail, some are doubtful. Common practice, no source.',
    'With a mate: least and most play as of any fit, ISO 286-1:2010, 3.3, against the play wanted.',
  ],
  fieldOf: [
    [/^original\.name/, 'originalName'],
    [/^other\.name/, 'otherName'],
    [/^dimensions\.(\d+)\.(\w+)\.low/, 'dimensions.$1.$2Low'],
    [/^dimensions\.(\d+)\.(\w+)\.high/, 'dimensions.$1.$2High'],
    [/^mates\.(\d+)\.(\w+)\.low/, 'mates.$1.$2Low'],
    [/^mates\.(\d+)\.(\w+)\.high/, 'mates.$1.$2High'],
    [/^(original|other)\.dimensions/, 'dimensions'],
  ],
  answer: (read) => {
    const answer = compareParts(requestOf(read));
    return {
      parts: [
        { kind: 'judgement', verdict: answer.verdict, reason: answer.reason },
        {
          kind: 'table',
          heading: 'Side by side',
          columns: [
            { name: 'Dimension' },
            { name: 'Original', figures: true },
            { name: 'Other', figures: true },
            { name: 'Differs by', figures: true },
            { name: 'Verdict' },
          ],
          rows: answer.dimensions.map(({ dimension, original, other, difference, verdict }) => [
            dimension,
            rangeWords(original),
            rangeWords(other),
            difference === null ? '–' : printedLength(difference),
            verdictWords[verdict],
          ]),
        },
      ],
      assumed: [
        'Only the dimensions given are compared: material, hardness, balance and threads are not.',
        'A difference is between the middles of the two ranges.',
      ],
      cautions: [
        'What turns, carries load or holds pressure is fitted only with its maker’s word that it suits.',
      ],
    };
  },
});

const verdictWords = {
  pass: 'fits',
  fail: 'does not fit',
  doubtful: 'doubtful',
  'not-judged': 'not judged',
} as const;

function rangeWords(limits: SizeLimits | null): string {
  return limits === null ? 'not known' : `${printedLength(limits.low)} to ${printedLength(limits.high)}`;
}

function requestOf(read: CaseReader): ComparePartsRequest {
  const rows = read.rows('dimensions');
  const names = rows.map((row) => row.text('dimension').trim());
  names.forEach((name, i) => {
    if (names.indexOf(name) !== i) {
      throw new InputError(`dimensions.${i}.dimension`, `“${name}” is there already.`);
    }
  });
  const part = (side: 'original' | 'other') => ({
    name: read.text(`${side}Name`),
    dimensions: Object.fromEntries(
      rows.flatMap((row, i) => {
        const limits = limitsIf(row, side, `dimensions.${i}.${side}`);
        return limits === undefined ? [] : [[names[i] ?? '', limits] as const];
      }),
    ),
  });
  return { original: part('original'), other: part('other'), mates: matesOf(read, names) };
}

function matesOf(read: CaseReader, names: readonly string[]): NonNullable<ComparePartsRequest['mates']> {
  return Object.fromEntries(
    read.rows('mates').map((row, i) => {
      const name = row.text('dimension').trim();
      if (!names.includes(name)) {
        throw new InputError(
          `mates.${i}.dimension`,
          'Write it as it stands in the list of dimensions above.',
        );
      }
      const limits = (of: string, negative: boolean): SizeLimits =>
        requireLimits(
          { low: row.quantity(`${of}Low`), high: row.quantity(`${of}High`) },
          `mates.${i}.${of}`,
          {
            negative,
          },
        );
      return [
        name,
        { is: row.choice<'hole' | 'shaft'>('is'), mate: limits('mate', false), play: limits('play', true) },
      ];
    }),
  );
}

/** Both limits or neither: one alone says nothing of a fit. */
function limitsIf(row: CaseReader, side: string, path: string): SizeLimits | undefined {
  const [low, high] = [row.quantityIf(`${side}Low`), row.quantityIf(`${side}High`)];
  if (low === undefined && high === undefined) return undefined;
  if (low === undefined || high === undefined) {
    const open = low === undefined ? 'low' : 'high';
    throw new InputError(
      `${path}.${open}`,
      'Give the least and the most; the same figure twice for one reading.',
    );
  }
  return requireLimits({ low, high }, path, { zero: false });
}

function rowsOf(rows: readonly WorkingCase[]): string {
  return writeRows(
    rows,
    dimensionColumns.map(({ name }: CellField) => name),
  );
}

function typedHub(key: KeySpec): WorkingCase {
  const row = (dimension: string, limits: KeySpec['hubBore']): WorkingCase => ({
    dimension,
    ...typedLimits(limits.value, 'originalLow', 'originalHigh'),
  });
  return {
    originalName: 'Hub as in the spec',
    otherName: 'Hub at hand',
    dimensions: rowsOf([
      row('bore', key.hubBore),
      row('width of the slot', key.hubKeywayWidth),
      row('depth of the slot', key.hubKeywayDepth),
    ]),
  };
}
