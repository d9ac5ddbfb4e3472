import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { judgeEntry } from '@second-spanner/shared/sheet/judge-entry';
import { beforeEach, describe, expect, it } from 'vitest';
import { ApiProblem } from '../http/api-problem';
import type { Sent } from '../offline/send-item';
import { WaitingTray, type ToKeep } from '../offline/waiting-tray';
import { SessionStore } from '../session/session-store';
import { sessionOf } from '../session/testing/sessions';
import { SheetStore } from './sheet-store';
import type { ShownStep } from './shown-step';
import { StepWork } from './step-work';
import { dialGauge, entryOf, mainClearance, stepOf } from './testing/steps';
import { sheetOf } from './testing/sheets';
import { ToolsStore } from './tools/tools-store';

const reading = (at: string) =>
  ({ kind: 'measurement', at, value: { value: 0.12, unit: 'mm' }, toolId: 'gauge' }) as const;

describe('the work on a step', () => {
  const step = signal<ShownStep | null>(null);
  const kept: ToKeep[] = [];
  const removed: number[] = [];
  let answer: (sent: Sent) => void;
  let work: StepWork;

  const show = (over: Partial<ShownStep> = {}): void => {
    step.set({ ...stepOf(mainClearance), entries: [], ...over });
  };

  beforeEach(() => {
    sessionStorage.clear();
    kept.length = 0;
    removed.length = 0;
    show();
    const { person } = sessionOf('builder');
    TestBed.configureTestingModule({
      providers: [
        StepWork,
        { provide: SessionStore, useValue: { person: signal(person), may: () => true } },
        { provide: ToolsStore, useValue: { all: () => [dialGauge] } },
        {
          provide: SheetStore,
          useValue: {
            id: signal('sheet'),
            code: signal('3.4'),
            step,
            judge: signal(judgeEntry),
            lines: signal([]),
            sheet: { hasValue: () => true, value: () => sheetOf() },
          },
        },
        {
          provide: WaitingTray,
          useValue: {
            items: signal([]),
            photoShare: signal(null),
            remove: (seq: number) => Promise.resolve(void removed.push(seq)),
            keep: (what: ToKeep) => {
              kept.push(what);
              return new Promise<Sent>((resolve) => {
                answer = resolve;
              });
            },
          },
        },
      ],
    });
    work = TestBed.inject(StepWork);
  });

  const settled = (): Promise<void> =>
    new Promise((resolve) => {
      setTimeout(resolve);
    });

  it('moves on while an entry is on its way, and says when it is kept', async () => {
    const recorded = work.record(mainClearance, reading('Main 1'));
    await settled();
    expect(work.slot()?.label).toBe('Main 2');
    expect(work.saving.state().state).toBe('saving');
    answer({ state: 'kept', step: stepOf(mainClearance) });

    expect(await recorded).toBe(true);
    expect(work.saving.state().state).toBe('kept');
  });

  it('says so when an entry waits for the network', async () => {
    const recorded = work.record(mainClearance, reading('Main 1'));
    await settled();
    answer({ state: 'waiting', problem: new ApiProblem(0, 'No network.') });

    expect(await recorded).toBe(true);
    expect(work.saving.state().state).toBe('waiting');
  });

  it('brings a refused entry’s place back to hand, with the sentence at its field', async () => {
    const recorded = work.record(mainClearance, reading('Main 1'));
    await settled();
    const errors = [{ field: 'content.toolId', message: 'Choose a tool from the register.' }];
    answer({ state: 'refused', problem: new ApiProblem(400, 'Refused', null, errors) });

    expect(await recorded).toBe(false);
    expect(work.slot()?.label).toBe('Main 1');
    expect(work.errorAt('content.toolId')).toBe('Choose a tool from the register.');
    work.touched();
    expect(work.errorAt('content.toolId')).toBeNull();
  });

  it('sends one entry for a button touched twice', async () => {
    void work.record(mainClearance, reading('Main 1'));
    void work.record(mainClearance, reading('Main 1'));
    await settled();
    expect(kept).toHaveLength(1);
  });

  it('replaces an entry only with a reason', async () => {
    const wrong = { ...entryOf(reading('Main 1'), { verdict: 'fail' }), inTray: null };
    show({ entries: [wrong] });
    work.correct(wrong);
    expect(await work.record(mainClearance, reading('Main 1'))).toBe(false);
    expect(work.errorAt('reason')).not.toBeNull();
    expect(kept).toHaveLength(0);

    work.reason.set('The gauge had slipped.');
    void work.record(mainClearance, reading('Main 1'));
    await settled();
    expect(kept[0]?.request).toMatchObject({ replaces: wrong.id, reason: 'The gauge had slipped.' });
  });

  it('takes an entry that still waits out of the tray, instead of replacing what nobody has', async () => {
    const waiting = { ...entryOf(reading('Main 1')), inTray: { seq: 7, refused: null } };
    show({ entries: [waiting] });
    work.correct(waiting);
    void work.record(mainClearance, reading('Main 1'));
    await settled();

    expect(removed).toEqual([7]);
    expect(kept[0]?.request).not.toHaveProperty('replaces', waiting.id);
  });

  it('is closed while the first figures are covered, or the api says so', () => {
    expect(work.isOpen()).toBe(true);
    show({ covered: true });
    expect(work.isOpen()).toBe(false);
    show({ can: { ...stepOf(mainClearance).can, record: false } });
    expect(work.isOpen()).toBe(false);
  });

  it('asks for a failing place again when nothing is empty any more', () => {
    const entries = ['Main 1', 'Main 2', 'Main 3'].map((at) => ({
      ...entryOf(reading(at), { verdict: at === 'Main 2' ? 'fail' : 'pass' }),
      inTray: null,
    }));
    show({ entries, done: 2, of: 3, openSnags: 1 });
    expect(work.slot()).toBeNull();
    expect(work.toRepeat()?.label).toBe('Main 2');
    // Accepted as it is by the foreman: the api counts it as done.
    show({ entries, done: 3, of: 3, openSnags: 0 });
    expect(work.toRepeat()).toBeNull();
  });

  it('judges by the judge of the step’s kind, and names the field that keeps it from one', () => {
    const { judgement, error } = work.judge(mainClearance, { ...reading('Main 1'), toolId: 'none' });
    expect(judgement).toBeNull();
    expect(error?.field).toBe('content.toolId');
    // 0.12 mm lies within 0.10 to 0.25 mm by more than the gauge's 0.01 mm.
    expect(work.judge(mainClearance, reading('Main 1')).judgement?.verdict).toBe('pass');
  });
});
