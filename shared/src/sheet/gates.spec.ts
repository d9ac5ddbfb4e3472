import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { mayRecord, nextStep, stepStatuses, waitsFor, type GateStep } from './gates.js';

// The rules are those of the sheet itself (hold point, rests on, second person), common practice, no source.

interface Sketch {
  readonly code: string;
  readonly restsOn?: readonly string[];
  readonly hold?: boolean;
  readonly critical?: boolean;
  readonly recorded?: boolean;
  readonly countersigned?: boolean;
  readonly openSnags?: number;
}

const step = (sketch: Sketch): GateStep => ({
  definition: {
    code: sketch.code,
    title: `Step ${sketch.code}`,
    restsOn: sketch.restsOn ?? [],
    hold: sketch.hold ?? false,
  },
  critical: sketch.critical ?? sketch.hold ?? false,
  facts: {
    done: sketch.recorded ? 1 : 0,
    of: 1,
    verdict: sketch.recorded ? 'pass' : null,
    recorders: [],
    countersigned: sketch.countersigned ?? false,
    openSnags: sketch.openSnags ?? 0,
  },
});

describe('statuses of a sheet', () => {
  it('opens a step only when what it rests on is done', () => {
    const steps = [step({ code: '1.1' }), step({ code: '1.2', restsOn: ['1.1'] })];
    expect(stepStatuses(steps)).toEqual(['open', 'waiting']);
    const done = [step({ code: '1.1', recorded: true }), step({ code: '1.2', restsOn: ['1.1'] })];
    expect(stepStatuses(done)).toEqual(['done', 'open']);
  });

  it('stops everything after a hold point until a second person has countersigned it', () => {
    const held = [step({ code: '3.9', hold: true, recorded: true }), step({ code: '4.1' })];
    expect(stepStatuses(held)).toEqual(['to-countersign', 'waiting']);
    const cleared = [
      step({ code: '3.9', hold: true, recorded: true, countersigned: true }),
      step({ code: '4.1' }),
    ];
    expect(stepStatuses(cleared)).toEqual(['done', 'open']);
  });

  it('does not count a step with an open snag as done, though all was recorded', () => {
    const steps = [
      step({ code: '1.1', recorded: true, openSnags: 1 }),
      step({ code: '1.2', restsOn: ['1.1'] }),
    ];
    expect(stepStatuses(steps)).toEqual(['snag', 'waiting']);
  });

  it('says what a step waits for, and for whom', () => {
    const steps = [
      step({ code: '3.9', hold: true, recorded: true }),
      step({ code: '4.1', critical: true, recorded: true }),
      step({ code: '4.2', restsOn: ['4.1'] }),
    ];
    const waits = waitsFor(steps, '4.2', 'Imogen Vale');
    expect(waits.map(({ what, code }) => [what, code])).toEqual([
      ['hold', '3.9'],
      ['step', '4.1'],
    ]);
    expect(waits.every(({ sentence }) => sentence.includes('Imogen Vale'))).toBe(true);
  });

  it('takes a correction while a failed reading is open, and nothing while two people disagree', () => {
    const steps = [step({ code: '1.1', openSnags: 1 })];
    expect(mayRecord(steps, '1.1', false)).toBe(true);
    expect(mayRecord(steps, '1.1', true)).toBe(false);
    expect(mayRecord(steps, '9.9', false)).toBe(false);
  });
});

describe('for any sheet', () => {
  const sketches = fc.array(
    fc.record({
      hold: fc.boolean(),
      critical: fc.boolean(),
      recorded: fc.boolean(),
      countersigned: fc.boolean(),
      openSnags: fc.integer({ min: 0, max: 1 }),
    }),
    { minLength: 1, maxLength: 30 },
  );
  const sheet = sketches.map((list) => list.map((each, index) => step({ ...each, code: `1.${index + 1}` })));

  it('never opens a step behind a hold point that is not countersigned', () => {
    fc.assert(
      fc.property(sheet, (steps) => {
        const statuses = stepStatuses(steps);
        const hold = steps.findIndex((each, index) => each.definition.hold && statuses[index] !== 'done');
        if (hold < 0) return;
        for (const status of statuses.slice(hold + 1)) expect(['open', 'in-hand']).not.toContain(status);
        for (const each of steps.slice(hold + 1).filter(({ facts }) => facts.done < facts.of)) {
          expect(mayRecord(steps, each.definition.code, false)).toBe(false);
        }
      }),
    );
  });

  it('names as next the first step that may be worked', () => {
    fc.assert(
      fc.property(sheet, (steps) => {
        const next = nextStep(steps);
        if (next !== null) expect(mayRecord(steps, next, false)).toBe(true);
        else
          expect(stepStatuses(steps).some((status) => status === 'open' || status === 'in-hand')).toBe(false);
      }),
    );
  });
});
