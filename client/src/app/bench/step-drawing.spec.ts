import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { EntryContent, StepDefinition } from '@second-spanner/shared/contracts/steps';
import { describe, expect, it } from 'vitest';
import { stepDrawing } from './step-drawing';

const common = {
  code: '3.9',
  stage: 3,
  title: 'Crankshaft {end float}',
  instruction: '',
  restsOn: [],
  hold: false,
  critical: true,
};

function step(definition: StepDefinition, contents: readonly EntryContent[]): StepDetail {
  const entries = contents.map((content, index) => ({
    id: String(index),
    content,
    verdict: 'pass' as const,
    reason: '',
    by: { id: 'tomasz', name: 'Tomasz Brandt', role: 'builder' as const },
    at: '2026-12-01T09:00:00Z',
    round: 1,
    replaces: null,
    replacedBy: null,
    replaceReason: null,
    current: true,
  }));
  return { definition, entries, covered: contents.length === 0 } as unknown as StepDetail;
}

const wiring: StepDefinition = {
  ...common,
  kind: 'wiring',
  cap: { firingOrder: [1, 3, 4, 2], rotation: 'anticlockwise' },
  outletsAt: 'top',
  valveTiming: { ivo: 16, ivc: 56, evo: 51, evc: 21 },
  advance: 10,
};

describe('a step’s drawing on the bench', () => {
  it('shows the last reading on its limits', () => {
    const definition: StepDefinition = {
      ...common,
      kind: 'measurement',
      method: 'dial-gauge',
      limits: { low: { value: 0.1, unit: 'mm' }, high: { value: 0.25, unit: 'mm' } },
      unit: 'mm',
      at: ['Centre main'],
    };
    const value = { value: 0.17, unit: 'mm' as const };
    const drawing = stepDrawing(
      step(definition, [{ kind: 'measurement', at: 'Centre main', value, toolId: 't' }]),
      'british',
    );
    expect(JSON.stringify(drawing?.table)).toContain('0.17');
  });

  it('shows what is done of a pass', () => {
    const definition: StepDefinition = {
      ...common,
      kind: 'tightening',
      group: {
        key: 'head-nuts',
        name: 'head nuts',
        noun: 'nut',
        outline: 'plain',
        thread: { value: '7/16-20 UNF' },
        condition: { value: 'oiled' },
        grade: { value: 'SAE 5' },
      },
      plan: {
        fasteners: { pattern: 'line', count: 3 },
        final: { value: 55, unit: 'N·m' },
        passes: [{ fraction: 1 }],
      },
      torque: { value: 55, unit: 'N·m' },
    };
    const pull = { kind: 'tightening' as const, pass: 1, fastener: '2', toolId: 't' };
    const words = JSON.stringify(stepDrawing(step(definition, [pull]), 'british')?.table);
    expect(words).toContain('done');
    expect(words).toContain('next');
    expect(JSON.stringify(stepDrawing(step(definition, []), 'british')?.table)).not.toContain('to come');
  });

  it('shows nothing of how leads ought to be before somebody has entered how they are', () => {
    const shown = (contents: readonly EntryContent[]): string =>
      JSON.stringify(stepDrawing(step(wiring, contents), 'british')?.shapes);
    const numbers = /"content":"[1-4]"/;
    expect(shown([])).not.toMatch(numbers);
    expect(shown([{ kind: 'wiring', fitted: { '1': 4, '2': 2, '3': 1, '4': 3 } }])).toMatch(numbers);
  });

  it('has none for what has no shape', () => {
    expect(stepDrawing(step({ ...common, kind: 'check' }, []), 'british')).toBeNull();
  });
});
