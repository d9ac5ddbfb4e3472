import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { InputError } from '../contracts/input-error.js';
import { readThread } from './read-thread.js';
import { metricThreads } from './tables/metric-threads.js';
import { unifiedCoarse, unifiedFine } from './tables/unified-threads.js';
import { whitworthCoarse, whitworthFine } from './tables/whitworth-threads.js';

describe('a thread as a workshop writes it', () => {
  it.each([
    ['M10x1.5', 'M10x1.5', 'metric-coarse'],
    ['M10 x 1,5', 'M10x1.5', 'metric-coarse'],
    ['m10×1.5', 'M10x1.5', 'metric-coarse'],
    ['M10-1.25', 'M10x1.25', 'metric-fine'],
    ['M10', 'M10x1.5', 'metric-coarse'],
    ['M3,5', 'M3.5x0.6', 'metric-coarse'],
    ['M14x1.25', 'M14x1.25', 'metric-fine'],
    ['3/8-16 UNC', '3/8-16 UNC', 'UNC'],
    ['3/8 UNF', '3/8-24 UNF', 'UNF'],
    ['3/8"-24 unf', '3/8-24 UNF', 'UNF'],
    ['3/8-24UNF', '3/8-24 UNF', 'UNF'],
    ['⅜ UNC', '3/8-16 UNC', 'UNC'],
    ['7/16 BSF', '7/16-18 BSF', 'BSF'],
    ['1/4" BSW', '1/4-20 BSW', 'BSW'],
    ['1/4 in Whit.', '1/4-20 BSW', 'BSW'],
    ['5/16 x 22 tpi BSF', '5/16-22 BSF', 'BSF'],
    ['1 1/8-7 UNC', '1 1/8-7 UNC', 'UNC'],
    ['1-1/8 UNF', '1 1/8-12 UNF', 'UNF'],
    ['1-8 UNC', '1-8 UNC', 'UNC'],
    ['No. 10-32 UNF', 'No. 10-32 UNF', 'UNF'],
    ['#10-24 UNC', 'No. 10-24 UNC', 'UNC'],
    ['10-32 UNF', 'No. 10-32 UNF', 'UNF'],
  ])('%s is %s', (text, name, series) => {
    expect(readThread(text)).toMatchObject({ name, series });
  });
});

describe('a thread that is not there', () => {
  it.each([
    ['M13', 'M12 and M14'],
    ['M200', 'the nearest: M30'],
    ['M10x1.3', 'M10x1.5, M10x1.25'],
    ['11/32 UNC', '5/16-18 UNC and 3/8-16 UNC'],
    ['3/8-24 UNC', 'With 24 it is 3/8-24 UNF'],
    ['3/8-17 UNC', '16 threads an inch, not 17'],
    ['3/8-16', '3/8-16 UNC, 3/8-16 BSW'],
    ['3/8', '3/8-16 UNC, 3/8-24 UNF, 3/8-16 BSW, 3/8-20 BSF'],
    ['1/0 UNC', '1/0 is no size'],
    ['0/0 UNC', '0/0 is no size'],
    ['0/4 UNC', '0/4 is no size'],
    ['2BA', 'BA are not in the tables'],
    ['1/4-18 NPTF', 'NPTF are not in the tables'],
    ['a big one', 'names no thread'],
    ['M10x', 'names no thread'],
    ['', 'empty'],
    ['M'.repeat(1e6), 'at most 40'],
    [10, 'text'],
    [null, 'text'],
  ])('%s: %s', (text, words) => {
    expect(() => readThread(text, 'bolt.thread')).toThrow(InputError);
    expect(() => readThread(text, 'bolt.thread')).toThrow(
      expect.objectContaining({ field: 'bolt.thread', message: expect.stringContaining(words) as string }),
    );
  });

  it('never throws anything but an error of its field, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        try {
          expect(readThread(text).stressArea).toBeGreaterThan(0);
        } catch (error) {
          expect(error).toBeInstanceOf(InputError);
        }
      }),
    );
  });
});

it('reads every thread of the tables back by its own name', () => {
  const names = [
    ...metricThreads.flatMap(({ diameter, pitches }) => pitches.map((pitch) => `M${diameter}x${pitch}`)),
    ...unifiedCoarse.map(({ size, perInch }) => `${size}-${perInch} UNC`),
    ...unifiedFine.map(({ size, perInch }) => `${size}-${perInch} UNF`),
    ...whitworthCoarse.map(({ size, perInch }) => `${size}-${perInch} BSW`),
    ...whitworthFine.map(({ size, perInch }) => `${size}-${perInch} BSF`),
  ];
  expect(names.map((name) => readThread(name).name)).toEqual(names);
});
