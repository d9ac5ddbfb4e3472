import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { SpecDocument } from '../../contracts/spec.js';
import type { Working, WorkingCase } from '../working.js';
import { workingText } from '../working-text.js';
import { beltLengthWorking } from './belt-length.js';
import { beltLineWorking } from './belt-line.js';
import { beltTensionWorking } from './belt-tension.js';

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
  it('a driver turned 0.5° is 4.36 mm out of plane over 500 mm', () => {
    // T6-021 and T6-026; the typed gaps are the printed 0.87 mm, whose angle is 0.498°.
    const gaps = { gap1driverFar: '0.87 mm', gap1drivenNear: '0.44 mm', gap1drivenFar: '0.44 mm' };
    const text = said(beltLineWorking, { ...beltLineWorking.example.typed, ...gaps });
    expect(text).toMatch(/dynamo pulley \| 4\.35\d? mm back/);
    expect(text).toMatch(/0\.50°, far rim back/);
    expect(text).toContain(
      '1. The straight edge does not lie flat on the crank pulley: 0.87 mm at its far rim',
    );
    expect(text).toContain('4.35 mm out of one plane (just over the 4.35 mm allowed over this span)');
    expect(text).not.toContain('towards the straight edge');
  });

  it('a driven pulley turned 0.87 mm in 100 mm is turned 0.50°', () => {
    // T6-021; 1.435 mm is the mean of its two gaps.
    const text = said(beltLineWorking, beltLineWorking.example.typed);
    expect(text).toMatch(/Pass: dynamo pulley: The rims are 1\.4\d mm out .* turned 0\.50°/);
    expect(text).not.toContain('does not lie flat');
  });

  it('pulleys without a name are called by what they do', () => {
    const text = said(beltLineWorking, { ...beltLineWorking.example.typed, driver: '', name1: '' });
    expect(text).toContain('Pass: driven pulley: ');
  });

  it('1.6 and 0.5 m, 12 m apart, take 27.32 m', () => {
    // T6-001, printed 27.32 m; exactly 27.3239 m (T6-002).
    expect(said(beltLengthWorking, beltLengthWorking.example.typed)).toMatch(/27\.3239 m/);
  });

  it('48 in drives 12 in at 1200 rev/min', () => {
    // T6-010, printed so.
    const typed = { driverDiameter: '48 in', drivenDiameter: '12 in', centres: '60 in', speed: '300' };
    expect(said(beltLengthWorking, typed)).toMatch(/4\.000 times as fast \(1200 rev\/min\)/);
  });

  it('a 15.87 in run gives 0.248 in', () => {
    // T6-029: 15.8745 in; 1/64 of it.
    const text = said(beltTensionWorking, beltTensionWorking.example.typed);
    expect(text).toMatch(/Free length: 15\.8745 in/);
    expect(text).toMatch(/It should give: 0\.248 in/);
    expect(text).toMatch(/Pass/);
  });
});

describe('errors land at their fields', () => {
  const line = beltLineWorking.example.typed;
  const length = beltLengthWorking.example.typed;
  const tension = beltTensionWorking.example.typed;
  it.each([
    [beltLineWorking, { ...line, driverDiameter: '0' }, 'driverDiameter'],
    [beltLineWorking, { ...line, span1: '0' }, 'span1'],
    [beltLineWorking, { ...line, diameter1: '0' }, 'diameter1'],
    [beltLineWorking, { ...line, name1: 'n'.repeat(90) }, 'name1'],
    [beltLineWorking, { ...line, groove1: '9 mm' }, 'driverGroove'],
    [beltLineWorking, { ...line, driverGroove: '9 mm' }, 'groove1'],
    [beltLineWorking, { ...line, shim1: '0' }, 'shim1'],
    [beltLineWorking, { ...line, angleLimit: '90' }, 'angleLimit'],
    [beltLineWorking, { ...line, offsetLimit: '9 m' }, 'offsetLimit'],
    [beltLineWorking, { ...line, gap1drivenFar: '1 bar' }, 'gap1drivenFar'],
    [beltLengthWorking, { ...length, centres: '1 m' }, 'centres'],
    [beltLengthWorking, { ...length, drivenDiameter: '0' }, 'drivenDiameter'],
    [beltTensionWorking, { ...tension, share: '2' }, 'share'],
    [beltTensionWorking, { ...tension, tolerance: '200' }, 'tolerance'],
    [beltTensionWorking, { ...tension, by: 'limits', low: '5 mm', high: '4 mm' }, 'low'],
  ] as const)('%#', (working, typed, field) => {
    const { errors } = working.workOut(typed, british);
    expect(Object.keys(errors)).toEqual([field]);
    expect(fieldNames(working)).toContain(field);
  });
});

it('takes three pulleys and a second set of gaps', () => {
  const gaps = (prefix: string, figures: readonly string[]): WorkingCase =>
    Object.fromEntries(
      ['driverFar', 'driverNear', 'drivenNear', 'drivenFar'].map((rim, i) => [
        `${prefix}${rim}`,
        figures[i] ?? '',
      ]),
    );
  const typed: WorkingCase = {
    ...beltLineWorking.example.typed,
    pulleys: 'three',
    sets1: 'two',
    ...gaps('turned1', ['0.87 mm', '0', '0.44 mm', '0.44 mm']),
    name2: 'pump pulley',
    diameter2: '120 mm',
    span2: '250 mm',
    ...gaps('gap2', ['0', '0', '-0.2 mm', '-0.2 mm']),
    shim2: '0.1 mm',
    behind2: '5 mm',
  };
  const { errors, missing, parts } = beltLineWorking.workOut(typed, british);
  expect({ errors, missing }).toEqual({ errors: {}, missing: null });
  expect(parts.filter(({ kind }) => kind === 'drawing')).toHaveLength(2);
});

describe('what a spec gives', () => {
  it.each(['at18', 'bx26', 'cv34'])('works out for %s', (code) => {
    for (const working of [beltLengthWorking, beltTensionWorking]) {
      const cases = working.fromSpec?.(spec(code)) ?? [];
      expect(cases).toHaveLength(1);
      const { errors, missing } = working.workOut(cases[0]?.typed ?? {}, british);
      expect({ errors, missing }).toEqual({ errors: {}, missing: null });
    }
  });

  it.each(['at18', 'bx26', 'cv34'])('begins the belt line of %s, whose gaps are to be measured', (code) => {
    const [one] = beltLineWorking.fromSpec?.(spec(code)) ?? [];
    const { errors, missing } = beltLineWorking.workOut(one?.typed ?? {}, british);
    expect(errors).toEqual({});
    expect(missing).toMatch(/gap, driver, far rim/i);
  });
});
