import { describe, expect, it } from 'vitest';
import demo from '../../../../test-data/shops/demo.json' with { type: 'json' };
import at18 from '../../../../test-data/specs/ok/at18.json' with { type: 'json' };
import bx26 from '../../../../test-data/specs/ok/bx26.json' with { type: 'json' };
import cv34 from '../../../../test-data/specs/ok/cv34.json' with { type: 'json' };
import type { Quantity, Unit } from '../../contracts/quantity.js';
import type { Tool, ToolKind } from '../../contracts/registers.js';
import type { EntryContent, MeasurementStep, StepDefinition } from '../../contracts/steps.js';
import type { Sighting } from '../../contracts/calculations.js';
import { capMap } from '../../ignition/cap-map.js';
import { agreementPossible } from '../../measuring/agreement-possible.js';
import { kindOf } from '../../quantities/convert.js';
import { checkSpecDocument } from '../../spec/check-document.js';
import { mayRecord, type GateStep } from '../gates.js';
import { judgeEntry } from '../judge-entry.js';
import { planOf } from '../plan-of.js';
import { compareSecond } from '../second-check.js';
import { uncertaintyAt } from '../tools.js';
import { proposeSheet } from './propose-sheet.js';

const on = '2025-06-01';
const shop = demo.shops[0]!;
const tools: readonly Tool[] = shop.tools.map(({ calibrationDueInDays, ...tool }) => ({
  ...(tool as unknown as Omit<Tool, 'id' | 'calibrationDue'>),
  id: tool.code,
  calibrationDue: calibrationDueInDays > 0 ? '2026-01-01' : '2025-01-01',
}));
const readWith = shop.readWith as Readonly<Record<string, readonly string[] | undefined>>;
const sheets = new Map(
  [at18, bx26, cv34].map((input) => {
    const document = checkSpecDocument(input);
    return [document.code, proposeSheet(document).steps] as const;
  }),
);
const stepOf = (spec: string, code: string): StepDefinition => {
  const step = sheets.get(spec)?.find((each) => each.code === code);
  if (!step) throw new Error(`${spec} has no step ${code}.`);
  return step;
};

const toolsFor = (step: MeasurementStep): readonly [Tool, Tool] => {
  const codes = readWith[step.method] ?? readWith[kindOf(step.unit)] ?? [];
  const [first, second] = codes.map((code) => tools.find((tool) => tool.code === code));
  if (!first || !second) throw new Error(`Nothing reads ${step.code} ${step.title} by ${step.method}.`);
  return [first, second];
};

/** The middle of two limits, or well inside one. */
function middle({ limits: { low, high }, unit }: MeasurementStep): Quantity {
  if (low && high) return { value: (low.value + high.value) / 2, unit };
  return { value: high ? high.value * 0.4 : (low?.value ?? 0) * 1.6, unit };
}

const measured = (at: string, value: Quantity, tool: Tool): EntryContent => ({
  kind: 'measurement',
  at,
  value,
  toolId: tool.id,
});

const context = { tools, on };
const recorded = (step: StepDefinition, contents: readonly EntryContent[]) =>
  contents.map((content, index) => ({
    id: String(index),
    content,
    round: 1,
    replaces: null,
    by: 'tomasz',
    verdict: judgeEntry(step, content, context).verdict,
  }));

const measurements = [...sheets].flatMap(([spec, steps]) =>
  steps.filter((step) => step.kind === 'measurement').map((step) => ({ spec, step })),
);

describe('the tools of the demo shop', () => {
  it('are fine enough for every reading of every sheet, the first and the second', () => {
    for (const { spec, step } of measurements) {
      for (const tool of toolsFor(step)) {
        const uncertainty = uncertaintyAt(tool, middle(step));
        const fine = agreementPossible(uncertainty, step.limits.low, step.limits.high);
        expect(fine, `${spec} ${step.code} ${step.title} with ${tool.code}`).toBe(true);
      }
    }
  });

  it('pass a reading in the middle of its limits, and agree when it is read again', () => {
    for (const { spec, step } of measurements) {
      const [first, second] = toolsFor(step);
      const value = middle(step);
      const entries = recorded(
        step,
        step.at.map((at) => measured(at, value, first)),
      );
      expect(new Set(entries.map(({ verdict }) => verdict)), `${spec} ${step.code}`).toEqual(
        new Set(['pass']),
      );
      if (step.secondCheck !== 'measured-again' && step.secondCheck !== 'strip-read-again') continue;
      const again = compareSecond(
        { definition: step, entries, tools, on },
        { kind: step.secondCheck, toolId: second.id, readings: step.at.map((at) => ({ at, value })) },
      );
      expect(again.verdict, `${spec} ${step.code} ${again.reason}`).toBe('pass');
    }
  });

  it('reach every torque, and pass it when it is pulled to the figure', () => {
    const named = [...shop.pullWith.withTolerance, ...shop.pullWith.withoutTolerance];
    const wrenches = tools.filter(({ code }) => named.includes(code));
    for (const [spec, steps] of sheets) {
      for (const step of steps) {
        if (step.kind !== 'tightening') continue;
        const kind: ToolKind = step.plan.tolerance ? 'digital-wrench' : 'click-wrench';
        for (const { pass, fastener, target, angle } of planOf(step).steps) {
          const verdicts = wrenches
            .filter((wrench) => wrench.kind === kind)
            .map((wrench) =>
              judgeEntry(
                step,
                {
                  kind: 'tightening',
                  pass,
                  fastener,
                  toolId: wrench.id,
                  ...(angle !== undefined && { angle }),
                  ...(target && (kind === 'click-wrench' ? { setting: target } : { reading: target })),
                },
                context,
              ),
            );
          expect(
            verdicts.map(({ verdict }) => verdict),
            `${spec} ${step.code} pass ${pass}: ${verdicts.map(({ reason }) => reason).join(' ')}`,
          ).toContain('pass');
        }
      }
    }
  });

  it('tell both TDCs from the sightings', () => {
    for (const [, steps] of sheets) {
      for (const step of steps) {
        if (step.kind !== 'valve-timing') continue;
        const { sightings, about } = demo.sightings[step.wanted];
        const content: EntryContent = {
          kind: 'valve-timing',
          sightings: sightings as readonly (readonly Sighting[])[],
          about,
        };
        expect(judgeEntry(step, content, context)).toMatchObject({ verdict: 'pass' });
      }
    }
  });
});

interface Event {
  readonly step: string;
  readonly what: string;
  readonly at?: string;
  readonly pull?: { readonly pass: number; readonly fastener: string };
  readonly unit?: string;
  readonly first?: unknown;
  readonly then?: unknown;
  readonly second?: unknown;
  readonly again?: unknown;
  readonly exchanged?: readonly number[];
}

const events = demo.shops.flatMap((each) =>
  each.sheets.flatMap((sheet) =>
    (sheet.events as readonly Event[]).map((event) => ({ spec: sheet.spec, sheet: sheet.code, event })),
  ),
);
const ofKind = (what: string) => events.filter(({ event }) => event.what === what);

/** The step's readings, in the middle but for those given. */
function contentsOf(
  step: MeasurementStep,
  given: unknown,
  unit: string | undefined,
  tool: Tool,
): EntryContent[] {
  const values = given as Readonly<Record<string, number>>;
  expect(step.at).toEqual(expect.arrayContaining(Object.keys(values)));
  return step.at.map((at) => {
    const value = values[at];
    return measured(at, value === undefined ? middle(step) : { value, unit: unit as Unit }, tool);
  });
}

describe('what happens on the demo sheets', () => {
  it('happens on steps that are there', () => {
    for (const { spec, event } of events) expect(stepOf(spec, event.step).code).toBe(event.step);
  });

  it('can be worked in the order of its steps, past what is left waiting', () => {
    for (const { sheets: shopSheets } of demo.shops) {
      for (const sheet of shopSheets) {
        const { spec, upTo } = sheet;
        const waiting: readonly string[] = ('notDone' in sheet && sheet.notDone) || [];
        const unseen: readonly string[] = ('notCountersigned' in sheet && sheet.notCountersigned) || [];
        const steps = sheets.get(spec) ?? [];
        const end = upTo ? steps.indexOf(stepOf(spec, upTo.step)) : -1;
        const worked = (at: number) => steps.map((definition, index) => workedTo(definition, index < at));
        const workedTo = (definition: StepDefinition, before: boolean): GateStep => {
          const done = before && !waiting.includes(definition.code) ? 1 : 0;
          const countersigned = done === 1 && !unseen.includes(definition.code);
          const facts = { done, of: 1, verdict: null, recorders: [], countersigned, openSnags: 0 };
          return { definition, critical: definition.critical, facts };
        };
        for (const [at, { code }] of steps.slice(0, end + 1).entries()) {
          if (!waiting.includes(code))
            expect(mayRecord(worked(at), code, false), `${sheet.code} ${code}`).toBe(true);
        }
        for (const code of waiting) expect(mayRecord(worked(end), code, false), code).toBe(false);
      }
    }
  });

  it('has readings on places that are there, and they pass', () => {
    for (const { sheets: shopSheets } of demo.shops) {
      for (const { spec, readings } of shopSheets) {
        for (const { step: code, values, unit } of readings as readonly (Event & { values?: unknown })[]) {
          const step = stepOf(spec, code);
          if (step.kind !== 'measurement') continue;
          const verdicts = recorded(step, contentsOf(step, values, unit, toolsFor(step)[0]));
          expect(new Set(verdicts.map(({ verdict }) => verdict)), `${spec} ${code}`).toEqual(
            new Set(['pass']),
          );
        }
      }
    }
  });

  it('disagrees where it says so, and agrees once it is read again', () => {
    expect(ofKind('disagreement').length).toBeGreaterThan(1);
    for (const { spec, event } of ofKind('disagreement')) {
      const step = stepOf(spec, event.step);
      if (step.kind !== 'measurement' || step.secondCheck !== 'measured-again') throw new Error(event.step);
      const [first, second] = toolsFor(step);
      const compare = (one: unknown, two: unknown) =>
        compareSecond(
          { definition: step, entries: recorded(step, contentsOf(step, one, event.unit, first)), tools, on },
          {
            kind: 'measured-again',
            toolId: second.id,
            readings: contentsOf(step, two, event.unit, second).flatMap((content) =>
              content.kind === 'measurement' ? [{ at: content.at, value: content.value }] : [],
            ),
          },
        ).verdict;
      expect(compare(event.first, event.second)).toBe('fail');
      expect(compare(event.again, event.again)).toBe('pass');
    }
  });

  it('is wrong before a correction and right after it', () => {
    for (const { spec, event } of ofKind('correction')) {
      const step = stepOf(spec, event.step);
      const judged = (value: unknown) => {
        const figure = value as Quantity;
        if (step.kind === 'measurement') {
          return judgeEntry(step, measured(event.at ?? '', figure, toolsFor(step)[0]), context).verdict;
        }
        const pull = event.pull ?? { pass: 0, fastener: '' };
        return judgeEntry(step, { kind: 'tightening', ...pull, toolId: 'T-07', reading: figure }, context)
          .verdict;
      };
      expect([judged(event.first), judged(event.then)], event.step).toEqual(['fail', 'pass']);
    }
  });

  it('fails where it is left open', () => {
    for (const { spec, event } of ofKind('left-open')) {
      const step = stepOf(spec, event.step);
      if (step.kind !== 'measurement') throw new Error(event.step);
      const contents = contentsOf(step, event.first, event.unit, toolsFor(step)[0]);
      expect(recorded(step, contents).map(({ verdict }) => verdict)).toContain('fail');
    }
  });

  it('is wired right but for the two leads that were changed over', () => {
    for (const { spec, event } of ofKind('wired-wrong')) {
      const step = stepOf(spec, event.step);
      if (step.kind !== 'wiring') throw new Error(event.step);
      const right = Object.fromEntries(
        capMap(step.cap).leads.map(({ outlet, cylinder }) => [outlet, cylinder]),
      );
      const [a, b] = event.exchanged ?? [];
      const wrong = Object.fromEntries(
        Object.entries(right).map(([outlet, cylinder]) => [
          outlet,
          cylinder === a ? (b ?? cylinder) : cylinder === b ? (a ?? cylinder) : cylinder,
        ]),
      );
      expect(judgeEntry(step, { kind: 'wiring', fitted: right }, context).verdict).toBe('pass');
      expect(judgeEntry(step, { kind: 'wiring', fitted: wrong }, context).verdict).toBe('fail');
    }
  });
});
