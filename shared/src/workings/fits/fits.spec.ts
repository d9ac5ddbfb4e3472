import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { SpecDocument } from '../../contracts/spec.js';
import type { Working, WorkingCase } from '../working.js';
import { workingText } from '../working-text.js';
import { comparePartsWorking } from './compare-parts.js';
import { fitWorking } from './fit.js';
import { heatToAssembleWorking } from './heat-to-assemble.js';
import { keyFitWorking } from './key-fit.js';

const british = { dialect: 'british' } as const;
const said = (working: Working, typed: WorkingCase): string =>
  workingText(working, typed, working.workOut(typed, british), british).replace(/\u2009/g, ' ');
const fieldNames = (working: Working): readonly string[] =>
  working.sections.flatMap(({ fields }) => fields.map(({ name }) => name));

const spec = (code: string): SpecDocument =>
  JSON.parse(
    readFileSync(new URL(`../../../../test-data/specs/ok/${code}.json`, import.meta.url), 'utf8'),
  ) as SpecDocument;

describe('the printed examples', () => {
  it('50 mm H7/p6 has 1 to 42 µm of interference', () => {
    // T5-036, printed so.
    const text = said(fitWorking, fitWorking.example.typed);
    expect(text).toMatch(/Tightest: 0\.042 mm of interference/);
    expect(text).toMatch(/Loosest: 0\.001 mm of interference/);
  });

  it('a 6 × 6 key has 0.3 mm over it', () => {
    // T5-045 and T5-046 (DIN 6885-1).
    const text = said(keyFitWorking, keyFitWorking.example.typed);
    expect(text).toMatch(/Pass: .*Over the key 0\.3 mm is free/);
    expect(text).toMatch(/DIN 6885-1 \| 6 mm × 6 mm \| 3\.5 mm \| 2\.8 mm/);
  });

  it('30 mm of steel is heated by 85 K, which are 153 °F of difference', () => {
    // T5-055; 85 K · 1.8.
    const text = said(heatToAssembleWorking, heatToAssembleWorking.example.typed);
    expect(text).toMatch(/Outer part: 105 °C \(221 °F\) \(85 °C, or 153 °F, above the room\)/);
    expect(text).not.toMatch(/185 °F|176|194/);
  });

  it('an 8 mm slot is no 1/4 in slot', () => {
    // 0.250 in = 6.35 mm, and N9 of 8 mm is 7.964 to 8 mm (T5-048, T5-042).
    expect(said(comparePartsWorking, comparePartsWorking.example.typed)).toMatch(/Fail: width of the slot/);
  });
});

describe('errors land at their fields', () => {
  const key = keyFitWorking.example.typed;
  const heat = heatToAssembleWorking.example.typed;
  const compare = comparePartsWorking.example.typed;
  it.each([
    [fitWorking, { ...fitWorking.example.typed, holeClass: 'h7' }, 'holeClass'],
    [fitWorking, { ...fitWorking.example.typed, shaftSize: '400 mm' }, 'shaftSize'],
    [fitWorking, { holeLow: '20.1 mm', holeHigh: '20 mm', shaftLow: '19 mm', shaftHigh: '19 mm' }, 'holeLow'],
    [fitWorking, { ...fitWorking.example.typed, holeSize: '5 kg' }, 'holeSize'],
    [keyFitWorking, { ...key, width: '0 mm' }, 'width'],
    [keyFitWorking, { ...key, hubDepth: '0' }, 'hubDepth'],
    [keyFitWorking, { ...key, depthFrom: 'edge', diameter: '' }, 'diameter'],
    [keyFitWorking, { ...key, depthFrom: 'edge', diameter: '5 mm' }, 'diameter'],
    [heatToAssembleWorking, { ...heat, interference: '90 mm' }, 'by'],
    [heatToAssembleWorking, { ...heat, hub: 'other', hubCoefficient: '0' }, 'hubCoefficient'],
    [heatToAssembleWorking, { ...heat, by: 'both', coldest: '30 °C' }, 'coldest'],
    [heatToAssembleWorking, { ...heat, diameter: '0' }, 'diameter'],
    [comparePartsWorking, { ...compare, dimensions: 'bore|2 mm|1 mm|1 mm|2 mm' }, 'dimensions.0.originalLow'],
    [comparePartsWorking, { ...compare, dimensions: 'bore|1 mm|2 mm|1 mm|' }, 'dimensions.0.otherHigh'],
    [comparePartsWorking, { ...compare, dimensions: 'bore|1|2|1|2;bore|1|2|1|2' }, 'dimensions.1.dimension'],
    [comparePartsWorking, { ...compare, mates: 'lip|hole|1|2|0|1' }, 'mates.0.dimension'],
    [
      comparePartsWorking,
      { ...compare, dimensions: 'bore|1|2|1|2', mates: 'bore|hole|1|2|3|1' },
      'mates.0.playLow',
    ],
  ] as const)('%#', (working, typed, field) => {
    const { errors } = working.workOut(typed, british);
    expect(Object.keys(errors)).toEqual([field]);
    expect(fieldNames(working)).toContain(field.split('.')[0]);
  });
});

describe('what a spec gives', () => {
  it.each(['at18', 'bx26', 'cv34'])('works out for %s', (code) => {
    const document = spec(code);
    for (const working of [fitWorking, keyFitWorking]) {
      const cases = working.fromSpec?.(document) ?? [];
      expect(cases).toHaveLength(document.keys.length);
      for (const { typed } of cases) {
        const { errors, missing, parts } = working.workOut(typed, british);
        expect({ errors, missing }).toEqual({ errors: {}, missing: null });
        expect(parts.length).toBeGreaterThan(1);
      }
    }
  });

  it.each(['at18', 'bx26', 'cv34'])('is half of a comparison for %s', (code) => {
    for (const { typed } of comparePartsWorking.fromSpec?.(spec(code)) ?? []) {
      const { errors, parts } = comparePartsWorking.workOut(typed, british);
      expect(errors).toEqual({});
      expect(parts[0]).toMatchObject({ verdict: 'not-judged' });
    }
  });

  it('asks for heat only where the bore is smaller than the shaft', () => {
    const document = spec('at18');
    const [key] = document.keys;
    expect(heatToAssembleWorking.fromSpec?.(document)).toEqual([]);
    const tight = {
      ...document,
      keys: [{ ...key!, hubBore: { value: { low: mm(31.96), high: mm(31.97) } } }],
    };
    // Shaft 31.98 to 32 mm in the spec.
    expect(heatToAssembleWorking.fromSpec?.(tight)[0]?.typed['interference']).toMatch(/^0\.04\smm$/);
  });
});

const mm = (value: number) => ({ value, unit: 'mm' }) as const;

it('takes a room of 20 °C and a thousandth of the diameter where nothing else is said', () => {
  const { room, clearance, ...rest } = heatToAssembleWorking.example.typed;
  expect([room, clearance]).toEqual(['20 °C', '14.8 µm']);
  const text = said(heatToAssembleWorking, rest);
  expect(text).toContain('Assumed: The room is at 20 °C.');
  expect(text).toContain('Clearance then: 30 µm');
  expect(text).toContain('a thousandth of the diameter is wanted');
});
