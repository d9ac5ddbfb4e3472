import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import at18 from '../../../../test-data/specs/ok/at18.json' with { type: 'json' };
import bx26 from '../../../../test-data/specs/ok/bx26.json' with { type: 'json' };
import cv34 from '../../../../test-data/specs/ok/cv34.json' with { type: 'json' };
import type { SpecDocument } from '../../contracts/spec.js';
import type { StepDefinition } from '../../contracts/steps.js';
import { checkSpecDocument } from '../../spec/check-document.js';
import { planOf } from '../plan-of.js';
import { capRequestOf, proposeSheet, valveTimingOf } from './propose-sheet.js';

const specs = [
  { name: 'at18', document: checkSpecDocument(at18) },
  { name: 'bx26', document: checkSpecDocument(bx26) },
  { name: 'cv34', document: checkSpecDocument(cv34) },
];

/** Stages that design calls hold stages. */
const holdStages = [1, 3, 4, 5, 8, 9, 11, 12];

function line(step: StepDefinition): string {
  const marks = [
    step.kind,
    step.critical ? `critical, ${step.secondCheck ?? 'no second check'}` : '',
    step.hold ? 'HOLD' : '',
    step.restsOn.length > 0 ? `rests on ${step.restsOn.join(' ')}` : '',
  ];
  return `${step.code.padEnd(6)}${step.title} [${marks.filter(Boolean).join('; ')}]`;
}

/** The steps of a proposal as a person reads them through beside the list of stages. */
function listing(document: SpecDocument): string {
  const { stages, steps } = proposeSheet(document);
  return stages
    .map(({ stage, title, hold }) =>
      [
        `${stage}. ${title}${hold ? ' (H)' : ''}`,
        ...steps.filter((step) => step.stage === stage).map(line),
        '',
      ].join('\n'),
    )
    .join('\n');
}

const golden = (name: string): URL => new URL(`../../../../test-data/proposals/${name}.txt`, import.meta.url);

describe.each(specs)('the sheet proposed for $name', ({ name, document }) => {
  const { stages, steps } = proposeSheet(document);
  const codes = steps.map(({ code }) => code);

  it('is the one that was read through', () => {
    expect(listing(document)).toBe(readFileSync(golden(name), 'utf8'));
  });

  it('has at least 90 steps in fourteen stages', () => {
    expect(stages).toHaveLength(14);
    expect(steps.length).toBeGreaterThanOrEqual(90);
    expect(new Set(steps.map(({ stage }) => stage)).size).toBe(14);
  });

  it('gives every step a code of its own, and rests it only on earlier ones', () => {
    expect(new Set(codes).size).toBe(codes.length);
    for (const [at, { code, restsOn }] of steps.entries()) {
      const earlier = codes.slice(0, at);
      expect(earlier, code).toEqual(expect.arrayContaining([...restsOn]));
    }
  });

  it('begins every stage with a step that rests on nothing', () => {
    for (const { stage } of stages) {
      expect(steps.find((step) => step.stage === stage)?.restsOn, `stage ${stage}`).toEqual([]);
    }
  });

  it('holds once in each stage that holds, at the last critical step', () => {
    expect(stages.filter(({ hold }) => hold).map(({ stage }) => stage)).toEqual(holdStages);
    for (const stage of holdStages) {
      const critical = steps.filter((step) => step.stage === stage && step.critical);
      expect(critical.map(({ hold }) => hold)).toEqual([...critical.slice(1).map(() => false), true]);
    }
    expect(steps.filter(({ hold }) => hold)).toHaveLength(holdStages.length);
  });

  it('names a second check on every critical step, and what to look for where one looks', () => {
    for (const step of steps) {
      expect(step.secondCheck !== undefined, step.code).toBe(step.critical);
      expect((step.lookFor?.length ?? 0) > 0, step.code).toBe(step.secondCheck === 'inspected');
    }
  });

  it('makes every torque, every wiring and every TDC critical', () => {
    for (const step of steps) {
      if (step.kind === 'tightening') expect(step.secondCheck).toBe('setting-and-pull-witnessed');
      if (step.kind === 'wiring' || step.kind === 'valve-timing') expect(step.secondCheck).toBe('read-again');
    }
    expect(steps.filter(({ kind }) => kind === 'wiring')).toHaveLength(1);
  });

  it('keeps sizes on the way to a clearance uncritical', () => {
    const sizes = document.measurements.filter(({ place }) =>
      ['bores', 'tunnels', 'journals'].includes(place),
    );
    for (const { name: title } of sizes) {
      expect(steps.find((step) => step.title === title)?.critical).toBe(false);
    }
  });

  it('turns the crank after every main cap and every rod', () => {
    for (const place of ['main-caps', 'big-ends']) {
      const repeats = document.fastenerGroups.find((group) => group.place === place)?.repeats ?? [];
      for (const repeat of repeats) {
        const tightened = steps.findIndex(
          ({ kind, title }) => kind === 'tightening' && title.endsWith(`, ${repeat.toLowerCase()}`),
        );
        expect(steps[tightened + 1]?.title).toMatch(/^Two full turns after /);
      }
    }
  });

  it('says in one to three sentences how a step is done, and ends each with a full stop', () => {
    for (const { code, title, instruction } of steps) {
      expect(instruction, code).toMatch(/^[A-Z{].*\.$/);
      expect(title, code).toMatch(/^(\{|[A-Z0-9])/);
      expect(title.length, title).toBeLessThanOrEqual(70);
    }
  });

  it('draws a plan for every tightening that begins nowhere doubtful', () => {
    for (const step of steps) {
      if (step.kind !== 'tightening') continue;
      const plan = planOf(step);
      expect(plan.steps.length, step.code).toBeGreaterThan(0);
      expect(plan.verdict, `${step.code} ${plan.reason}`).not.toBe('doubtful');
    }
  });

  it('ends the cautions of each stage with whose word comes first, after what the spec adds', () => {
    for (const { stage, cautions } of stages) {
      expect(cautions.length).toBeGreaterThan(1);
      expect(cautions.at(-1)).toContain("maker's data, local codes and qualified practice");
      for (const own of document.cautions.filter((caution) => caution.stage === stage)) {
        expect(cautions).toContain(own.text.value);
      }
    }
  });
});

describe('what one engine has and another has not', () => {
  const titles = (input: unknown): string[] =>
    proposeSheet(checkSpecDocument(input)).steps.map(({ title, instruction }) => `${title}: ${instruction}`);

  it('puts mushroom followers in before the camshaft', () => {
    const steps = titles(bx26);
    const mushroom = steps.findIndex((step) => step.startsWith('Mushroom {followers}'));
    expect(mushroom).toBeGreaterThan(-1);
    expect(mushroom).toBeLessThan(steps.findIndex((step) => step.startsWith('Camshaft in:')));
    expect(titles(at18).some((step) => step.startsWith('Mushroom'))).toBe(false);
  });

  it('tightens the heads of a vee by bank, and turns its rod chamfers outwards', () => {
    const steps = titles(cv34);
    expect(steps.filter((step) => /^Tighten the head bolts, bank [12]:/.test(step))).toHaveLength(2);
    expect(steps.some((step) => step.startsWith('Valley manifold faces meet'))).toBe(true);
    expect(steps.some((step) => step.includes('chamfers look outwards'))).toBe(true);
    expect(titles(at18).some((step) => step.includes('chamfer'))).toBe(false);
  });

  it('sets hot clearances after the run, and preload where the followers are hydraulic', () => {
    const hot = proposeSheet(checkSpecDocument(bx26)).steps.filter(({ title }) =>
      title.includes('engine hot'),
    );
    expect(hot.map(({ stage }) => stage)).toEqual([14, 14]);
    expect(titles(cv34).filter((step) => step.includes('preload,')).length).toBe(2);
  });

  it('traces a cap only where the outlets do not show their posts', () => {
    expect(titles(at18).some((step) => step.startsWith('Cap traced'))).toBe(true);
    expect(titles(bx26).some((step) => step.startsWith('Cap traced'))).toBe(false);
  });
});

describe('what a sheet takes from a spec', () => {
  const document = checkSpecDocument(at18);

  it('is the cap with its trace', () => {
    expect(capRequestOf(document)).toMatchObject({
      firingOrder: [1, 3, 4, 2],
      rotation: 'anticlockwise',
      firstPost: 'A',
      trace: { A: 'B', B: 'A', C: 'C', D: 'D' },
    });
  });

  it('is the valve timing', () => {
    expect(valveTimingOf(document)).toEqual({ ivo: 16, ivc: 56, evo: 51, evc: 21 });
  });

  it('leaves out what the spec has nothing for', () => {
    const bare = { ...document, fastenerGroups: [], measurements: [], keys: [], compounds: [], parts: [] };
    const { steps } = proposeSheet(bare);
    expect(steps.some(({ kind }) => kind === 'tightening')).toBe(false);
    expect(steps.filter(({ hold }) => hold).map(({ stage }) => stage)).toEqual(holdStages);
  });
});
