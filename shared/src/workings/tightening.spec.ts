import { describe, expect, it } from 'vitest';
import at18 from '../../../test-data/specs/ok/at18.json' with { type: 'json' };
import bx26 from '../../../test-data/specs/ok/bx26.json' with { type: 'json' };
import cv34 from '../../../test-data/specs/ok/cv34.json' with { type: 'json' };
import type { SpecDocument } from '../contracts/spec.js';
import { unreadable } from '../drawing/drawing-case.js';
import { threadStackWorking } from './thread-stack.js';
import { threadWorking } from './thread.js';
import { tighteningPlanWorking } from './tightening-plan.js';
import { torqueDoubtWorking } from './torque-doubt.js';
import { workingText } from './working-text.js';
import type { Working, WorkingAnswer, WorkingCase } from './working.js';
import { wrenchSettingWorking } from './wrench-setting.js';
import { wrenchSuitsWorking } from './wrench-suits.js';

const all = [
  tighteningPlanWorking,
  torqueDoubtWorking,
  wrenchSettingWorking,
  wrenchSuitsWorking,
  threadStackWorking,
  threadWorking,
];
const specs = [at18, bx26, cv34] as unknown as readonly SpecDocument[];
const options = { dialect: 'british' } as const;

const answer = (working: Working, typed: WorkingCase): WorkingAnswer => working.workOut(typed, options);
const textOf = (working: Working, typed: WorkingCase): string =>
  workingText(working, typed, answer(working, typed), options).replaceAll('\u2009', ' ');
const changed = (working: Working, more: WorkingCase): WorkingCase => ({ ...working.example.typed, ...more });

describe('the examples answer with what is printed', () => {
  it.each([
    // T4-145, PASS.
    [
      tighteningPlanWorking,
      [
        '8.1 lbf·ft',
        '16.2 lbf·ft',
        '27 lbf·ft',
        'Order worked out: ',
        'Tighten: 1, 3, 2, 4',
        'Loosen: 4, 2, 3, 1',
      ],
    ],
    // T4-070, TQ-E: 4941 lbf at 75 % of proof.
    [torqueDoubtWorking, ['Pass:', '75 %', '(4944 lbf)']],
    // T4-124, CF-R: 117.39 lbf·in.
    [wrenchSettingWorking, ['Set it to: 117.4 lbf·in']],
    // T4-138, I6789.
    [wrenchSuitsWorking, ['7.52 N·m to 8.48 N·m', '±6']],
    // By hand: 50 − 35 − 2 − 8.4 = 4.6 mm.
    [threadStackWorking, ['Past the nut: 4.6 mm, 3.1 pitches']],
    // T4-003, EE-MA: 57.99 mm².
    [threadWorking, ['57.99 mm²', '9.026 mm', '8.160 mm']],
  ])('$key', (working, printed) => {
    const text = textOf(working, working.example.typed);
    for (const words of printed) expect(text).toContain(words);
    expect(text).not.toMatch(/undefined|NaN|\{|request|field/);
  });
});

describe('the cases of a spec', () => {
  const cases = all.flatMap((working) =>
    specs.flatMap((spec) =>
      (working.fromSpec?.(spec) ?? []).map(({ name, typed }) => ({
        key: working.key,
        working,
        title: `${spec.code}, ${name}`,
        typed,
      })),
    ),
  );

  it('are one a group, but for those whose thread no table has', () => {
    for (const spec of specs) {
      expect(tighteningPlanWorking.fromSpec?.(spec)).toHaveLength(spec.fastenerGroups.length);
      const taper = spec.fastenerGroups.filter(({ thread }) => thread.value.includes('NPT')).length;
      expect(torqueDoubtWorking.fromSpec?.(spec)).toHaveLength(spec.fastenerGroups.length - taper);
    }
  });

  it.each(cases)('work out: $key, $title', ({ working, typed }) => {
    const { errors, missing, parts } = answer(working, typed);
    expect(errors).toEqual({});
    // What only a builder at the engine knows is still to be typed: the wrench and the lengths.
    const isWhole = ![wrenchSettingWorking, wrenchSuitsWorking, threadStackWorking].includes(working);
    expect(missing === null).toBe(isWhole);
    for (const part of parts) {
      if (part.kind === 'drawing') expect(unreadable(part.drawing)).toEqual([]);
    }
  });

  it('doubt no printed pair of figures for its rounding', () => {
    const doubts = cases
      .filter(({ working, typed }) => working === torqueDoubtWorking && 'alsoPrinted' in typed)
      .map(({ working, typed }) => textOf(working, typed));
    expect(doubts.length).toBeGreaterThan(40);
    expect(doubts.filter((text) => text.includes('is a slip'))).toEqual([]);
  });
});

describe('what is wrong stands at the field that it was typed in', () => {
  const grid: WorkingCase = { layout: 'grid', rows: '2', columns: '5', torque: '27 lbf·ft' };
  const listed: WorkingCase = { layout: 'positions', torque: '27 lbf·ft' };
  it.each<[Working, WorkingCase, string]>([
    [tighteningPlanWorking, { ...grid, rows: '0' }, 'rows'],
    [tighteningPlanWorking, { ...grid, columns: '2.5' }, 'columns'],
    [tighteningPlanWorking, { layout: 'circle', count: '9999', torque: '27 lbf·ft' }, 'count'],
    [tighteningPlanWorking, { ...grid, torque: '0 N·m' }, 'torque'],
    [tighteningPlanWorking, { ...grid, torque: '' }, 'torque'],
    [tighteningPlanWorking, { ...grid, below: '30 lbf·ft' }, 'below'],
    [tighteningPlanWorking, { ...grid, above: '1 mm' }, 'above'],
    [tighteningPlanWorking, { ...grid, sequence: '1 2 3' }, 'sequence'],
    [tighteningPlanWorking, { ...grid, passes: '50 %;150 %' }, 'passes.1.to'],
    [tighteningPlanWorking, { ...grid, passes: '50 %;half' }, 'passes.1.to'],
    [tighteningPlanWorking, { ...grid, passes: '50 %;90 N·m' }, 'passes.1.to'],
    [tighteningPlanWorking, { ...grid, passes: '60°' }, 'passes.0.to'],
    [tighteningPlanWorking, { ...listed, positions: 'A|0|0;A|1|0' }, 'positions.1.fastener'],
    [tighteningPlanWorking, { ...listed, positions: 'A|0|0;B|0|0' }, 'positions.1.fastener'],
    [tighteningPlanWorking, { ...listed, positions: 'A|x|0' }, 'positions.0.x'],
    [torqueDoubtWorking, changed(torqueDoubtWorking, { torque: '0 lbf·ft' }), 'torque'],
    [torqueDoubtWorking, changed(torqueDoubtWorking, { alsoPrinted: '0 N·m' }), 'alsoPrinted'],
    [torqueDoubtWorking, changed(torqueDoubtWorking, { thread: '3/8-17 UNC' }), 'thread'],
    [torqueDoubtWorking, changed(torqueDoubtWorking, { grade: 'cheese' }), 'grade'],
    [torqueDoubtWorking, changed(torqueDoubtWorking, { condition: 'factor', nutFactor: '15' }), 'nutFactor'],
    [torqueDoubtWorking, changed(torqueDoubtWorking, { spread: '100' }), 'spread'],
    [torqueDoubtWorking, changed(torqueDoubtWorking, { into: 'steel', engagement: '1 N·m' }), 'engagement'],
    [wrenchSettingWorking, changed(wrenchSettingWorking, { torque: '0 N·m' }), 'torque'],
    [wrenchSettingWorking, changed(wrenchSettingWorking, { wrenchLength: '0 mm' }), 'wrenchLength'],
    [
      wrenchSettingWorking,
      changed(wrenchSettingWorking, { adapterLength: '10 in', angle: '180' }),
      'adapterLength',
    ],
    [wrenchSettingWorking, changed(wrenchSettingWorking, { angle: '999' }), 'angle'],
    [wrenchSettingWorking, changed(wrenchSettingWorking, { division: '0 N·m' }), 'division'],
    [wrenchSuitsWorking, changed(wrenchSuitsWorking, { torque: '0 N·m' }), 'torque'],
    [wrenchSuitsWorking, changed(wrenchSuitsWorking, { below: '9 N·m' }), 'below'],
    [wrenchSuitsWorking, changed(wrenchSuitsWorking, { rangeLow: '20 N·m' }), 'rangeLow'],
    [wrenchSuitsWorking, changed(wrenchSuitsWorking, { rangeHigh: '0 N·m' }), 'rangeHigh'],
    [wrenchSuitsWorking, changed(wrenchSuitsWorking, { resolution: '0 N·m' }), 'resolution'],
    [wrenchSuitsWorking, changed(wrenchSuitsWorking, { deviation: '80' }), 'deviation'],
    [wrenchSuitsWorking, changed(wrenchSuitsWorking, { due: 'soon', on: '2026-12-01' }), 'due'],
    [wrenchSuitsWorking, changed(wrenchSuitsWorking, { due: '2026-12-01', on: 'today' }), 'on'],
    [threadStackWorking, changed(threadStackWorking, { thread: 'M11.5' }), 'thread'],
    [threadStackWorking, changed(threadStackWorking, { boltLength: '0 mm' }), 'boltLength'],
    [threadStackWorking, changed(threadStackWorking, { grip: '0 mm' }), 'grip'],
    [threadStackWorking, changed(threadStackWorking, { washers: '100 m' }), 'washers'],
    [threadStackWorking, changed(threadStackWorking, { thread: '3/8 UNF' }), 'nutHeight'],
    [threadStackWorking, changed(threadStackWorking, { leastPitches: '40' }), 'leastPitches'],
    [threadStackWorking, changed(threadStackWorking, { into: 'steel', threadDepth: '0 mm' }), 'threadDepth'],
    [
      threadStackWorking,
      changed(threadStackWorking, { into: 'steel', threadDepth: '20 mm', holeDepth: '10 mm' }),
      'holeDepth',
    ],
    [threadWorking, { thread: '1/4-18 NPTF' }, 'thread'],
  ])('%#: $key', (working, typed, field) => {
    const { errors, parts } = answer(working, typed);
    expect(Object.keys(errors)).toEqual([field]);
    expect(parts).toEqual([]);
    const names = working.sections.flatMap((section) =>
      section.fields.flatMap((one) =>
        one.kind === 'rows' ? one.columns.map(({ name }) => `${one.name}.${name}`) : [one.name],
      ),
    );
    expect(names).toContain(field.replace(/\.\d+\./, '.'));
  });
});

describe('a plan', () => {
  it('says what it took where no passes are typed', () => {
    const typed = { layout: 'line', count: '4', torque: '20 N·m' };
    const { assumed } = answer(tighteningPlanWorking, typed);
    expect(assumed.join(' ')).toContain('Two passes');
    expect(textOf(tighteningPlanWorking, typed)).toContain('10 N·m');
  });

  it('shows torque, angle and check passes with their limits', () => {
    const typed = {
      layout: 'circle',
      count: '8',
      torque: '40 N·m',
      below: '2 N·m',
      passes: '20 N·m;100 %;60°;check',
    };
    const text = textOf(tighteningPlanWorking, typed);
    expect(text).toContain('2 | to 100 % | 40 N·m (29.5 lbf·ft) | 38 N·m to 40 N·m');
    expect(text).toContain('3 | 60° further | 60° | –');
    expect(text).toContain('4 | check all once more');
    // The star of eight, ASME PCC-1 (from memory).
    expect(text).toContain('Tighten: 1, 5, 3, 7, 2, 6, 4, 8');
  });
});

describe('a torque that is doubted', () => {
  it('is drawn with both printed figures, and its female thread is judged beside it', () => {
    const typed = changed(torqueDoubtWorking, {
      torque: '27 lbf·ft',
      alsoPrinted: '37 N·m',
      into: 'aluminium',
      engagement: '0.5 in',
    });
    const { parts } = answer(torqueDoubtWorking, typed);
    const drawing = parts.find((part) => part.kind === 'drawing');
    expect(drawing?.drawing.table.rows.map(([torque]) => torque)).toEqual(['27\u2009lbf·ft', '37\u2009N·m']);
    const judged = parts.filter((part) => part.kind === 'judgement');
    expect(judged.map(({ of, verdict }) => [of, verdict])).toEqual([
      [undefined, 'doubtful'],
      ['Female thread', 'fail'],
    ]);
  });

  it('has no band where nothing can be judged', () => {
    const typed = changed(torqueDoubtWorking, { grade: 'unknown' });
    expect(answer(torqueDoubtWorking, typed).parts.map(({ kind }) => kind)).toEqual([
      'judgement',
      'facts',
      'table',
    ]);
  });
});

describe('a length in the wrong unit', () => {
  it.each([
    // 55 lbf·ft with 18 in and 2½ in: 55·18/20.5 = 48.29 lbf·ft, by hand.
    [
      { wrenchLength: '18', adapterLength: '2 1/2"' },
      'Doubtful: A wrench 18 mm long? As typed, its adapter is longer',
    ],
    [
      { wrenchLength: '90 mm', adapterLength: '40 mm' },
      'Doubtful: A wrench 90 mm long? As typed, no torque wrench',
    ],
    [{ wrenchLength: '18 in', adapterLength: '2 1/2' }, 'Set it to: 48.29 lbf·ft'],
    [{ wrenchLength: '18 in', adapterLength: '2 1/2' }, 'Assumed: 2 1/2 was taken as inches.'],
    [{ wrenchLength: '18 in', adapterLength: '2 1/2' }, 'middle of the fastener: 2 1/2 in'],
    [{ wrenchLength: '18 in', adapterLength: '2½' }, 'Set it to: 48.29 lbf·ft'],
  ])('%j', (lengths, words) => {
    expect(textOf(wrenchSettingWorking, { torque: '55 ft lbs', ...lengths })).toContain(words);
  });

  it('is not asked about where it can be right', () => {
    expect(
      textOf(wrenchSettingWorking, { torque: '55 ft lbs', wrenchLength: '18 in', adapterLength: '64 mm' }),
    ).not.toMatch(/Doubtful|taken as inches/);
  });
});

describe('a torque for a bolt of no known grade', () => {
  it('is set against the common grades of its thread', () => {
    // T4-070: 30.9 lbf·ft is 75 % of the proof load of SAE 5, 85 ksi; so 116 % at 55 ksi and 53 % at 120 ksi.
    const text = textOf(torqueDoubtWorking, { torque: '30.9 lbf·ft', thread: '3/8-16 UNC' });
    expect(text).toContain('SAE grade 2 | 116 % | over its proof load');
    expect(text).toContain('SAE grade 5 | 75 % | believable');
    expect(text).toContain('SAE grade 8 | 53 % | believable');
    expect(textOf(torqueDoubtWorking, { torque: '50 N·m', thread: 'M10' })).toContain('class 10.9 | ');
  });

  it('says where the top of its range is past proof', () => {
    const top = 'At the top of that range it is past proof.';
    expect(textOf(torqueDoubtWorking, torqueDoubtWorking.example.typed)).toContain(top);
    expect(textOf(torqueDoubtWorking, changed(torqueDoubtWorking, { spread: '10' }))).not.toContain(top);
  });
});

it('says where fasteners stand in words', () => {
  const text = textOf(tighteningPlanWorking, {
    layout: 'positions',
    positions: '8|0|0;4|100|0',
    passes: 'check',
  });
  expect(text).toContain('Where they stand: fastener 8, across 0, down 0; fastener 4, across 100, down 0');
});
