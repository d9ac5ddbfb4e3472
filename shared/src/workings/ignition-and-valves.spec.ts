import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { SpecDocument } from '../contracts/spec.js';
import type { AnswerPart, Working, WorkingAnswer, WorkingCase } from './working.js';
import { dwellWorking } from './dwell.js';
import { lashOrderWorking } from './lash-order.js';
import { leadTestWorking } from './lead-test.js';
import { lifterPreloadWorking } from './lifter-preload.js';
import { pistonHeightWorking } from './piston-height.js';
import { positiveStopWorking } from './positive-stop.js';
import { rotorCheckWorking } from './rotor-check.js';
import { writeRows } from './rows.js';
import { shimWorking } from './shim.js';
import { timingFiguresWorking } from './timing-figures.js';
import { timingMarksWorking } from './timing-marks.js';
import { valveClockWorking } from './valve-clock.js';
import { whichTdcWorking } from './which-tdc.js';
import { sightingColumns } from './which-tdc-fields.js';
import { workingText } from './working-text.js';

const all: readonly Working[] = [
  rotorCheckWorking,
  leadTestWorking,
  timingMarksWorking,
  dwellWorking,
  valveClockWorking,
  whichTdcWorking,
  lashOrderWorking,
  timingFiguresWorking,
  positiveStopWorking,
  shimWorking,
  lifterPreloadWorking,
  pistonHeightWorking,
];

const answerOf = (working: Working, change: WorkingCase = {}): WorkingAnswer =>
  working.workOut({ ...working.example.typed, ...change }, { dialect: 'british' });

/** The value of a named fact, its thin spaces made plain. */
function fact(answer: WorkingAnswer, name: string): string | undefined {
  const facts = answer.parts.flatMap((part) => (part.kind === 'facts' ? part.facts : []));
  return facts.find((one) => one.name === name)?.value.replaceAll('\u2009', ' ');
}

const judgement = ({ parts }: WorkingAnswer): Extract<AnswerPart, { kind: 'judgement' }> | undefined =>
  parts.find((part) => part.kind === 'judgement');

const stepsOf = ({ parts }: WorkingAnswer): readonly string[] =>
  parts.flatMap((part) => (part.kind === 'steps' ? part.steps : []));

describe('examples answer with what is printed', () => {
  it('dwell: 6 ms and 4 ms', () => {
    // DW1, T2-059 and T2-060.
    expect(fact(answerOf(dwellWorking), 'Points closed')).toBe('4.00 ms');
    expect(fact(answerOf(dwellWorking), 'Points open')).toBe('30°');
  });

  it('timing marks: 0.35016 in', () => {
    // DMP1, T3-049: prints 0.3501.
    const answer = answerOf(timingMarksWorking);
    expect(fact(answer, 'Distance along the rim')).toBe('0.350 in');
    expect(fact(answerOf(timingMarksWorking, { from: 'arc', arc: '0.350157 in' }), 'Angle')).toBe('6°');
  });

  it('lead test: 13.8 to 19.7 kΩ', () => {
    // LEAD-M, T2-067.
    const answer = answerOf(leadTestWorking);
    expect(judgement(answer)?.verdict).toBe('pass');
    expect(fact(answer, 'Least that is right')).toBe('13.78 kΩ');
    expect(fact(answer, 'Most that is right')).toBe('19.68 kΩ');
    expect(judgement(answerOf(leadTestWorking, { shows: 'open' }))?.verdict).toBe('fail');
  });

  it('rotor: half of 10° past its post at TDC', () => {
    const answer = answerOf(rotorCheckWorking);
    expect(judgement(answer)?.verdict).toBe('pass');
    expect(fact(answer, 'Past it, the way the rotor turns')).toBe('0°');
    const half = answerOf(rotorCheckWorking, { rotor: '230' });
    expect(judgement(half)?.verdict).toBe('doubtful');
    expect(stepsOf(half).join(' ')).toContain('No. 4’s rock');
  });

  it('clock: 226°, 234° and 10°', () => {
    // VT2, T3-002.
    const answer = answerOf(valveClockWorking);
    expect(fact(answer, '{Inlet} open')).toBe('226°');
    expect(fact(answer, 'Overlap')).toBe('10°');
    const table = answer.parts.find((part) => part.kind === 'table');
    expect(table?.rows[0]).toEqual(['1', 'power', '0°', 'shut', 'shut']);
  });

  it('which TDC: No. 6’s valves rock while No. 1 is to be set', () => {
    // OVLM, T3-028.
    expect(judgement(answerOf(whichTdcWorking))).toMatchObject({ of: 'Compression TDC', verdict: 'pass' });
    const clock = answerOf(whichTdcWorking).parts.find((part) => part.kind === 'drawing');
    expect(clock?.drawing.description).toContain('Cylinder 6: inlet opening, exhaust closing.');
    const columns = sightingColumns.map(({ name }) => name);
    const seen = writeRows([{ position: '1', cylinder: '1', piston: 'top' }], columns);
    const untold = answerOf(whichTdcWorking, { seen });
    expect(judgement(untold)).toMatchObject({ of: 'Cannot be told yet', verdict: 'not-judged' });
    expect(stepsOf(untold)[0]).toContain('No. 6');
  });

  it('clearance order: valve 1 when valve 8 is fully open', () => {
    // R9O, T3-020.
    const answer = answerOf(lashOrderWorking);
    expect(fact(answer, 'Rule of nine')).toBe('holds');
    const table = answer.parts.find((part) => part.kind === 'table');
    expect(table?.rows.map((row) => row[3])).toEqual(['8', '7', '6', '5', '4', '3', '2', '1']);
    expect(fact(answerOf(lashOrderWorking, { valves: 'E I E I E I E I' }), 'Rule of nine')).toBeUndefined();
  });

  it('timing figures: lobe centres 106° and 114°', () => {
    const answer = answerOf(timingFiguresWorking);
    expect(fact(answer, '{Inlet} lobe centre')).toBe('106°');
    expect(fact(answer, 'The camshaft stands')).toBe('4° advanced');
    const spec = { compare: 'yes', 'spec-ivo': '17', 'spec-ivc': '29', 'spec-evo': '61', 'spec-evc': '-7' };
    const late = answerOf(timingFiguresWorking, { ...spec, 'spec-by': 'lift', 'spec-at': '1 mm' });
    expect(judgement(late)?.reason).toContain('the whole camshaft stands 10° late');
  });

  it('stop: the pointer is 0.75° out', () => {
    // DEG, T3-016.
    expect(fact(answerOf(positiveStopWorking), 'Pointer to be moved by')).toBe('0.75°');
  });

  it('shim: 2.40 mm', () => {
    const answer = answerOf(shimWorking);
    expect(fact(answer, 'Shim for the middle')).toBe('2.4 mm');
    expect(fact(answer, 'Nearest at hand')).toBe('2.4 mm');
  });

  it('preload: 1/32 in', () => {
    expect(fact(answerOf(lifterPreloadWorking), 'Preload')).toBe('0.03125 in');
  });

  it('piston height: 7.68 in at TDC, 27.37 m/s at most', () => {
    // PM1, T3-030 and T3-034: 1077.54 in/s.
    expect(fact(answerOf(pistonHeightWorking), 'Pin height')).toBe('7.6775 in');
    expect(fact(answerOf(pistonHeightWorking), 'Greatest')).toBe('27.37 m/s');
  });
});

const fieldNames = (working: Working): readonly string[] =>
  working.sections.flatMap(({ fields }) => fields.map(({ name }) => name));

describe.each(all.map((working) => [working.key, working] as const))('%s', (_, working) => {
  it('says every error at a field that is there', () => {
    const wrong = [
      '-7',
      '0',
      '1e9',
      '99999',
      'x',
      '90 N',
      '0 mm',
      '5 MΩ',
      '1-1-2',
      ';;|;',
      '1|9|||||',
      '1|1|||||',
    ];
    const fields = working.sections.flatMap((section) => section.fields);
    for (const { name } of fields) {
      for (const value of wrong) {
        const typed = { ...working.example.typed, [name]: value };
        const { errors } = working.workOut(typed, { dialect: 'british' });
        for (const path of Object.keys(errors)) {
          expect([value, fieldNames(working)]).toEqual([value, expect.arrayContaining([path.split('.')[0]])]);
          const field = fields.find((one) => one.name === path.split('.')[0]);
          expect([name, value, path, field?.when?.(typed)]).not.toEqual([name, value, path, false]);
        }
      }
    }
  });

  it.each(['at18', 'bx26', 'cv34'])('takes what the spec %s has', (name) => {
    const path = new URL(`../../../test-data/specs/ok/${name}.json`, import.meta.url);
    const document = JSON.parse(readFileSync(path, 'utf8')) as SpecDocument;
    for (const { typed } of working.fromSpec?.(document) ?? []) {
      const known = fieldNames(working);
      expect(Object.keys(typed).filter((field) => !known.includes(field))).toEqual([]);
      const answer = working.workOut(typed, { dialect: 'british' });
      expect(answer.errors).toEqual({});
      // What the spec cannot know, such as a reading, is asked for and named.
      if (answer.missing === null) expect(answer.parts.length).toBeGreaterThan(0);
    }
  });

  it('reads as plain text in either trade’s words, with every token put in', () => {
    const { typed } = working.example;
    for (const dialect of ['british', 'american'] as const) {
      const text = workingText(working, typed, working.workOut(typed, { dialect }), { dialect });
      expect(text).not.toMatch(/[{}]|undefined|NaN|\[object/);
    }
  });
});

it.each([valveClockWorking, lashOrderWorking, pistonHeightWorking])(
  'works the spec’s case of $key out whole',
  (working) => {
    for (const name of ['at18', 'bx26', 'cv34']) {
      const path = new URL(`../../../test-data/specs/ok/${name}.json`, import.meta.url);
      const document = JSON.parse(readFileSync(path, 'utf8')) as SpecDocument;
      for (const { typed } of working.fromSpec?.(document) ?? []) {
        expect(working.workOut(typed, { dialect: 'british' })).toMatchObject({ errors: {}, missing: null });
      }
    }
  },
);

describe('what may stay open or be written shortly', () => {
  const said = (working: Working, typed: WorkingCase): string =>
    workingText(working, typed, working.workOut(typed, { dialect: 'british' }), {
      dialect: 'british',
    }).replace(/\u2009/g, ' ');
  const six = { order: '1-5-3-6-2-4', ivo: '10', ivc: '50', evo: '50', evc: '10', cylinder: '1' };

  it('a TDC told by rocking valves alone says what it takes and leaves', () => {
    // No. 6 fires 360° after No. 1; its valves rock from 10° before to 10° after its exhaust TDC, 10° either way more.
    const text = said(whichTdcWorking, { ...six, seen: '|6||||yes|' });
    expect(text).toContain('leaves it 20° before to 20° after TDC, to within 10°');
    expect(text).toContain('From and to: 20° before to 20° after TDC');
    expect(text).toContain('Assumed: No. 1’s piston is taken to be at the top: it was not looked at.');
    expect(said(whichTdcWorking, { ...six, seen: '1|1|||top||;|6||||yes|' })).not.toContain(
      'it was not looked at',
    );
  });

  it('sightings without a position are seen row by row', () => {
    const text = said(whichTdcWorking, { ...six, seen: '|1|shut|shut|top||;|1||opening|||' });
    expect(text).toContain('Assumed: Each thing was seen after the one above it');
  });

  it('an angle before its first goes round', () => {
    // 720° is a whole cycle.
    const at = (crank: string) =>
      valveClockWorking.workOut({ ...valveClockWorking.example.typed, crank }, { dialect: 'british' });
    expect(at('-10')).toEqual(at('710'));
    expect(at('730')).toEqual(at('10'));
    expect(at('-10').errors).toEqual({});
  });

  it('a stop names each valve’s cylinder and kind', () => {
    // Valve 1 of E I I E E I I E is No. 1's exhaust valve, 2 its inlet valve.
    const text = said(lashOrderWorking, lashOrderWorking.example.typed);
    expect(text).toContain('1 (No. 1 exhaust)');
    expect(text).toContain('2 (No. 1 inlet)');
  });

  it('a field still open is named as in a sentence', () => {
    const { missing } = valveClockWorking.workOut({}, { dialect: 'british' });
    expect(missing).toContain('{inlet} opens');
  });

  it('an open lead hides the maker’s figures', () => {
    const typed = { ...leadTestWorking.example.typed, shows: 'open' };
    expect(said(leadTestWorking, typed)).not.toContain('Most resistance for that length');
    expect(said(leadTestWorking, typed)).toContain('Fail');
  });

  it('a figure in no unit is told the units of its kind', () => {
    const { errors } = leadTestWorking.workOut(
      { ...leadTestWorking.example.typed, reading: '25 k' },
      { dialect: 'british' },
    );
    expect(errors['reading']).toBe('There is no unit “k”. Write it in Ω, kΩ or MΩ.');
  });
});
