import type { CompareParts, ComparedDimension, ComparePartsRequest, SizeLimits } from '../contracts/fits.js';
import { InputError } from '../contracts/input-error.js';
import type { Verdict } from '../contracts/verdict.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { clip } from '../quantities/clip.js';
import { requireOneOf, requireRecord, requireText } from '../quantities/require.js';
import { judgeDimension, type Mate } from './judge-dimension.js';
import { requireLimits } from './require-limits.js';

const mostDimensions = 40;

interface Part {
  readonly name: string;
  readonly dimensions: ReadonlyMap<string, SizeLimits>;
}

/**
 * One part beside another maker's, dimension by dimension. Lengths of any unit; a difference (middle of the
 * other's less middle of the original's) is in the original's.
 *
 * Where a dimension's mate is known, the play that the other part leaves is judged: `pass` where all of it is
 * allowed, `fail` where none is, `doubtful` between. Without a mate the other's limits are held against the
 * original's in the same way. A dimension that only one of them has is `not-judged`. The whole is as its worst.
 *
 * @throws InputError on `original`, `other`, `mates` and below; on `mates.<name>` that neither part has
 * Source: definition of play; common practice, no source for the verdicts.
 * Example: a pulley's bore 16.00 to 16.02 mm for one of 16.00 to 16.01 mm is `doubtful`.
 */
export function compareParts(request: ComparePartsRequest): CompareParts {
  const given = requireRecord(request, 'request');
  const original = readPart(given['original'], 'original');
  const other = readPart(given['other'], 'other');
  const names = [...new Set([...original.dimensions.keys(), ...other.dimensions.keys()])];
  if (names.length === 0) {
    throw new InputError('original.dimensions', 'Give at least one dimension of the two parts.');
  }
  const mates = readMates(given['mates'], names);
  const dimensions = names.map((name) => compare(name, original, other, mates.get(name)));
  return { ...overall(dimensions, other.name), dimensions };
}

function readPart(input: unknown, field: string): Part {
  const given = requireRecord(input, field);
  const path = `${field}.dimensions`;
  const dimensions = requireRecord(given['dimensions'], path, { max: mostDimensions });
  return {
    name: requireText(given['name'], `${field}.name`, { max: 80 }),
    dimensions: new Map(
      Object.entries(dimensions).map(([name, limits]) => [
        requireText(name, path, { max: 80 }),
        requireLimits(limits, `${path}.${name}`, { zero: false }),
      ]),
    ),
  };
}

function readMates(input: unknown, names: readonly string[]): ReadonlyMap<string, Mate> {
  if (input === undefined) return new Map();
  const given = requireRecord(input, 'mates', { max: 2 * mostDimensions });
  return new Map(
    Object.entries(given).map(([name, mate]) => {
      const path = `mates.${name}`;
      if (!names.includes(name)) {
        throw new InputError(path, `Neither part has a dimension “${clip(name)}”.`);
      }
      const one = requireRecord(mate, path);
      return [
        name,
        {
          is: requireOneOf(one['is'], ['hole', 'shaft'] as const, `${path}.is`),
          mate: requireLimits(one['mate'], `${path}.mate`, { zero: false }),
          play: requireLimits(one['play'], `${path}.play`, { negative: true }),
        },
      ];
    }),
  );
}

function compare(dimension: string, original: Part, other: Part, mate: Mate | undefined): ComparedDimension {
  const before = original.dimensions.get(dimension) ?? null;
  const after = other.dimensions.get(dimension) ?? null;
  const difference =
    before === null || after === null
      ? null
      : fromSi(
          (toSi(after.low) + toSi(after.high) - toSi(before.low) - toSi(before.high)) / 2,
          before.low.unit,
        );
  return { dimension, original: before, other: after, difference, ...judgeDimension(before, after, mate) };
}

const ranks = ['fail', 'doubtful', 'not-judged', 'pass'] as const satisfies readonly Verdict[];

function overall(
  dimensions: readonly ComparedDimension[],
  name: string,
): Pick<CompareParts, 'verdict' | 'reason'> {
  const verdict = ranks.find((rank) => dimensions.some((one) => one.verdict === rank)) ?? 'pass';
  if (verdict === 'pass') {
    return {
      verdict,
      reason: `${name} fits in all ${dimensions.length} ${dimensions.length === 1 ? 'dimension' : 'dimensions'} given.`,
    };
  }
  const telling = dimensions.filter((one) => one.verdict === verdict);
  return {
    verdict,
    reason: telling.map(({ dimension, reason }) => `${dimension}: ${reason}`).join(' '),
  };
}
