import { readFileSync, readdirSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FormulaRequest } from '../../contracts/measuring.js';
import type { Quantity, Unit } from '../../contracts/quantity.js';
import { InputError } from '../../contracts/input-error.js';
import { checkFormula } from './check-formula.js';
import { formula } from './formula.js';
import { longestFormula } from './parse-formula.js';

const of = (value: number, unit: Unit): Quantity => ({ value, unit });
const readings = {
  bore: of(50.04, 'mm'),
  journal: of(50, 'mm'),
  gauge: of(2, 'thou'),
  bolt: of(27, 'lbf·ft'),
};
const ask = (text: unknown, unit: unknown = 'mm') =>
  formula({ formula: text, readings, unit } as FormulaRequest);

/** Worked by hand; 1 thou = 0.0254 mm by definition. */
describe('formula', () => {
  it.each([
    ['bore - journal', 0.04],
    ['bore − journal', 0.04],
    ['(bore + journal) ÷ 2', 50.02],
    ['bore - journal - gauge', -0.0108],
    ['2 × gauge', 0.1016],
    ['gauge*2', 0.1016],
    ['-(journal - bore)', 0.04],
    ['+bore - journal', 0.04],
    ['bore * journal / journal', 50.04],
    ['0.00075 · journal', 0.0375],
    ['1.5e-3*journal', 0.075],
    ['bore - journal*bore/bore', 0.04],
  ])('%s is %d mm', (text, expected) => {
    expect(ask(text).value.unit).toBe('mm');
    expect(ask(text).value.value).toBeCloseTo(expected, 10);
  });

  it('carries kinds: an area, a volume, a torque over a length', () => {
    expect(ask('bore*journal', 'cm2').value.value).toBeCloseTo(25.02, 10);
    expect(ask('bore*bore*gauge', 'mm3').value.value).toBeCloseTo(50.04 * 50.04 * 0.0508, 9);
    // 27 lbf·ft over 50 mm: T1-008's 36.607 084 604 947 81 N·m over 0.05 m.
    expect(ask('bolt/journal', 'N').value.value).toBeCloseTo(36.60708460494781 / 0.05, 8);
  });

  it('says which readings it uses, each once', () => {
    expect(ask('bore - journal + bore - bore').uses).toEqual(['bore', 'journal']);
  });

  it('judges the answer at its limits, free of what rounding left behind', () => {
    const limits = { low: of(0.04, 'mm'), high: of(0.06, 'mm') };
    const request = { formula: 'bore - journal', readings, unit: 'mm', limits } as const;
    expect(formula(request).verdict).toBe('pass');
    expect(formula({ ...request, uncertainty: of(0.005, 'mm') }).verdict).toBe('doubtful');
    expect(formula({ ...request, limits: { high: of(1, 'thou') } }).verdict).toBe('fail');
    expect(ask('bore - journal').verdict).toBe('not-judged');
  });

  it('gives the same for readings in other units', () => {
    const length = fc.double({ min: 0.001, max: 500, noNaN: true });
    fc.assert(
      fc.property(length, length, fc.constantFrom<Unit>('in', 'thou', 'µm', 'm'), (a, b, unit) => {
        const inMm = { a: of(a, unit), b: of(b, 'mm') };
        const there = formula({ formula: '(a + b) / 2 - b', readings: inMm, unit }).value;
        const back = formula({ formula: 'x', readings: { x: there }, unit: 'mm' }).value.value;
        const plain = formula({ formula: '(a + b) / 2 - b', readings: inMm, unit: 'mm' }).value.value;
        expect(back).toBeCloseTo(plain, 6);
      }),
    );
  });
});

describe('a formula is refused', () => {
  it.each([
    ['nothing', ''],
    ['no text', 12],
    ['a list', ['bore']],
    ['a sign at the end', 'bore -'],
    ['a bracket open', '(bore - journal'],
    ['a reading that is not there', 'bore - tunnel'],
    ['an assignment', 'a=1'],
    ['an assignment to a reading', 'bore = 1'],
    ['a function definition', 'f(x)=x'],
    ['a function call', 'sqrt(bore)'],
    ['min and max', 'min(bore, journal)'],
    ['import', 'import({ pi: 3 })'],
    ['createUnit', 'createUnit("knurl")'],
    ['evaluate', 'evaluate("1+1")'],
    ['evaluate without quotes', 'evaluate(bore)'],
    ['parse', 'parse("bore")'],
    ['the constructor', 'constructor'],
    ['the constructor of a reading', 'bore.constructor'],
    ['a chain of properties', 'bore.constructor.constructor'],
    ['a chain by brackets', 'bore["constructor"]["constructor"]("return process")()'],
    ['__proto__', '__proto__'],
    ['toString', 'toString'],
    ['hasOwnProperty', 'hasOwnProperty - bore'],
    ['a number that is not decimal', '0x10 * bore'],
    ['a range', '1:1e9'],
    ['a matrix', '[1, 2; 3, 4]'],
    ['growing a matrix', 'ones(1e6, 1e6)'],
    ['an index', 'bore[1]'],
    ['an object', '{a: 1}'],
    ['a string', '"bore"'],
    ['two statements', 'bore; journal'],
    ['two lines', 'bore\njournal bore'],
    ['a comment', 'bore # journal'],
    ['a choice', 'bore ? 1 : 2'],
    ['a power', 'bore ^ 2'],
    ['a tower of powers', '9^9^9^9'],
    ['a factorial', '170!!!'],
    ['a percentage', 'bore%'],
    ['a unit', '5 mm'],
    ['a unit bomb', '1 m m m m m m m m m'],
    ['a conversion', 'bore to inch'],
    ['a remainder', 'bore mod journal'],
    ['logic', 'bore and journal'],
    ['a comparison', 'bore > journal'],
    ['true', 'true'],
    ['Infinity', 'bore * Infinity'],
    ['NaN', 'bore * NaN'],
    ['a number past all figures', 'bore * 1e999'],
    ['multiplying without a sign', '2 bore'],
    ['a comma for a point', 'bore - 49,5'],
    ['other letters', 'bоre'],
    ['division by nothing', 'bore/(journal - journal)'],
    ['10,000 brackets', `${'('.repeat(10_000)}bore${')'.repeat(10_000)}`],
    ['brackets to the full length', `${'('.repeat(90)}bore${')'.repeat(90)}`],
    ['brackets, never closed', '('.repeat(longestFormula)],
    ['minuses to the full length', `${'-'.repeat(longestFormula - 4)}bore`],
    ['a megabyte of digits', '9'.repeat(1_000_000)],
    ['a megabyte of spaces', ' '.repeat(1_000_000)],
    ['a length and a torque', 'bore + bolt'],
    ['a length and a number', 'bore + 1'],
  ])('%s', (_what, text) => {
    expect(() => ask(text)).toThrow(expect.objectContaining({ name: 'InputError', field: 'formula' }));
  });

  it('whatever is typed, with an error of ours or an answer', () => {
    const alphabet = fc.constantFrom(...'bore journal+-*/()^.,:;[]{}="\'!%&|<>?#0123456789eE\n');
    const text = fc.oneof(fc.string({ maxLength: 60, unit: alphabet }), fc.string({ maxLength: 60 }));
    fc.assert(
      fc.property(text, (typed) => {
        try {
          expect(Number.isFinite(ask(typed).value.value)).toBe(true);
        } catch (error) {
          expect(error).toBeInstanceOf(InputError);
        }
      }),
      { numRuns: 2000 },
    );
  });

  it.each<[string, unknown]>([
    ['request', null],
    ['readings', { formula: 'a', readings: [], unit: 'mm' }],
    ['readings', { formula: 'a', readings: { 'a b': of(1, 'mm') }, unit: 'mm' }],
    ['readings', { formula: 'a', readings: { mod: of(1, 'mm') }, unit: 'mm' }],
    ['readings', { formula: 'a', readings: JSON.parse('{ "__proto__": 1 }'), unit: 'mm' }],
    [
      'readings',
      { formula: 'a', readings: Object.fromEntries(Array.from({ length: 99 }, (_, i) => [`a${i}`, 1])) },
    ],
    ['readings.a', { formula: 'a', readings: { a: 1 }, unit: 'mm' }],
    ['readings.a.value', { formula: 'a', readings: { a: of(NaN, 'mm') }, unit: 'mm' }],
    ['readings.a.unit', { formula: 'a', readings: { a: of(20, '°C') }, unit: 'mm' }],
    ['unit', { formula: 'a', readings: { a: of(1, 'mm') } }],
    ['unit', { formula: 'a', readings: { a: of(1, 'mm') }, unit: 'furlong' }],
    ['unit', { formula: 'a', readings: { a: of(1, 'mm') }, unit: '°C' }],
    ['unit', { formula: 'a', readings: { a: of(1, 'mm') }, unit: 'N·m' }],
    ['unit', { formula: 'a/a', readings: { a: of(1, 'mm') }, unit: 'mm' }],
    ['formula', { formula: 'a - b', readings: { a: of(1, 'N'), b: of(2, 'N') }, unit: 'N' }],
    [
      'limits.high.unit',
      { formula: 'a', readings: { a: of(1, 'mm') }, unit: 'mm', limits: { high: of(1, 'N') } },
    ],
    [
      'uncertainty.value',
      { formula: 'a', readings: { a: of(1, 'mm') }, unit: 'mm', uncertainty: of(-1, 'mm') },
    ],
  ])('on %s', (field, request) => {
    expect(() => formula(request as FormulaRequest)).toThrow(
      expect.objectContaining({ name: 'InputError', field }),
    );
  });
});

describe('checkFormula', () => {
  const kinds = { bore_min: 'length', journal_max: 'length', pull: 'torque' } as const;

  it('takes a formula before there are readings', () => {
    expect(checkFormula('bore_min − journal_max', kinds, 'length')).toEqual(['bore_min', 'journal_max']);
    expect(checkFormula('pull / (bore_min - journal_max)', kinds, 'force')).toHaveLength(3);
  });

  it.each([
    ['formula', 'bore_min - tunnel', 'length'],
    ['formula', 'bore_min * journal_max', 'length'],
    ['formula', 'bore_min + pull', 'length'],
    ['formula', 'bore_min.constructor', 'length'],
  ] as const)('refuses on %s: %s', (field, text, gives) => {
    expect(() => checkFormula(text, kinds, gives)).toThrow(
      expect.objectContaining({ name: 'InputError', field }),
    );
  });
});

it('is all that loads the parser, and the rest of measuring does not load it', () => {
  const root = new URL('../../', import.meta.url);
  const files = readdirSync(root, { recursive: true, encoding: 'utf8' }).filter(
    (file) => file.endsWith('.ts') && !file.endsWith('.spec.ts'),
  );
  const importing = (what: RegExp): string[] =>
    files.filter((file) => what.test(readFileSync(new URL(file, root), 'utf8')));
  expect(importing(/from 'mathjs/)).toEqual(['measuring/formula/parse-formula.ts']);
  const users = importing(/from '\.[^']*formula\/?[^']*\.js'|from '\.\/(parse-)?formula\.js'/);
  expect(
    users.filter((file) => file.startsWith('measuring/') && !file.startsWith('measuring/formula/')),
  ).toEqual([]);
});
