import { judgeEntry } from '@second-spanner/shared/sheet/judge-entry';
import { describe, expect, it } from 'vitest';
import type { TrayItem } from '../offline/tray-item';
import { opensByTray } from './open-offline';
import { shownStep } from './shown-step';
import { dialGauge, endFloat, entryOf, mainClearance, stepOf } from './testing/steps';

const builder = { id: 'builder', name: 'Tomasz Brandt', role: 'builder' } as const;
const item = (value: number, over: Partial<TrayItem> = {}): TrayItem => ({
  seq: 1,
  key: 'key-1',
  personId: 'builder',
  sheetId: 'sheet',
  sheetCode: 'LM-0147',
  stepCode: '3.14',
  words: '',
  keptAt: '2026-03-02T11:00:00Z',
  request: {
    content: { kind: 'measurement', at: 'At the front', value: { value, unit: 'mm' }, toolId: 'gauge' },
  },
  ...over,
});

const judging = { judge: judgeEntry, tools: [dialGauge] };

describe('a step with the tray laid over it', () => {
  it('shows a waiting entry as current, judged here', () => {
    const step = shownStep(stepOf(endFloat), [item(0.17)], builder, judging);
    expect(step.entries.map(({ verdict, current, by }) => [verdict, current, by.name])).toEqual([
      ['pass', true, 'Tomasz Brandt'],
    ]);
    const failing = shownStep(stepOf(endFloat), [item(0.4)], builder, judging);
    expect(failing.entries[0]?.verdict).toBe('fail');
  });

  it('judges nothing as long as what judges is on its way', () => {
    const step = shownStep(stepOf(endFloat), [item(0.4)], builder, { ...judging, judge: null });
    expect(step.entries.map(({ verdict, current }) => [verdict, current])).toEqual([['not-judged', true]]);
  });

  it('strikes the entry that a waiting one replaces', () => {
    const first = entryOf({
      kind: 'measurement',
      at: 'At the front',
      value: { value: 0.4, unit: 'mm' },
      toolId: 'gauge',
    });
    const correction = item(0.17);
    const step = shownStep(
      stepOf(endFloat, { entries: [first] }),
      [{ ...correction, request: { ...correction.request, replaces: first.id, reason: 'misread' } }],
      builder,
      judging,
    );
    expect(step.entries.map(({ current, replacedBy }) => [current, replacedBy])).toEqual([
      [false, 'key-1'],
      [true, null],
    ]);
  });

  it('shows a refused entry with its reason, and counts it for nothing', () => {
    const step = shownStep(stepOf(endFloat), [item(0.17, { refused: 'Not now.' })], builder, judging);
    expect(step.entries.map(({ current, inTray }) => [current, inTray?.refused])).toEqual([
      [false, 'Not now.'],
    ]);
  });
});

describe('a step that opens by the tray', () => {
  const waiting = stepOf(endFloat, {
    waitsFor: [{ what: 'step', code: '3.4', sentence: 'It rests on 3.4, which is not done.' }],
  });
  const before = (over: object = {}) => [{ ...stepOf(mainClearance, { done: 1, of: 3 }), ...over }];
  const at = (place: string, seq: number) =>
    item(0.05, {
      seq,
      stepCode: '3.4',
      request: {
        content: { kind: 'measurement', at: place, value: { value: 0.05, unit: 'mm' }, toolId: 'gauge' },
      },
    });

  it('does so when all that is missing before it lies in the tray', () => {
    expect(opensByTray(waiting, before(), [at('Main 2', 1)])).toBe(false);
    expect(opensByTray(waiting, before(), [at('Main 2', 1), at('Main 2', 2)])).toBe(false);
    expect(opensByTray(waiting, before(), [at('Main 2', 1), at('Main 3', 2)])).toBe(true);
  });

  it('does so when what it waited for is done by now', () => {
    const held = stepOf(endFloat, { waitsFor: [{ what: 'hold', code: '3.4', sentence: 'Hold point.' }] });
    expect(opensByTray(held, before({ critical: true, status: 'done' }), [])).toBe(true);
    expect(opensByTray(held, before({ critical: true, status: 'to-countersign' }), [])).toBe(false);
  });

  it('never passes a second person by', () => {
    const lying = [at('Main 2', 1), at('Main 3', 2)];
    expect(opensByTray(waiting, before({ critical: true }), lying)).toBe(false);
    expect(opensByTray(waiting, before({ openSnags: 1 }), lying)).toBe(false);
    const held = stepOf(endFloat, { waitsFor: [{ what: 'hold', code: '3.4', sentence: 'Hold point.' }] });
    expect(opensByTray(held, before(), lying)).toBe(false);
  });
});
