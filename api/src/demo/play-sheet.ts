import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { HttpProblem } from '../platform/errors/http-problem.js';
import type { SheetServices } from '../sheets/sheet-services.js';
import { workingTime, type DemoClock } from './demo-clock.js';
import type { PlayedStep } from './demo-events.js';
import type { DemoSheet } from './demo-sheet-file.js';
import { playStep, type Play } from './play-step.js';

export interface SheetToPlay {
  readonly sheet: DemoSheet;
  readonly play: Play;
  readonly clock: DemoClock;
  readonly today: Date;
}

/** Plays a planned sheet as far as it is written: on the stand, step by step, and signed. */
export async function playSheet({ sheet, play, clock, today }: SheetToPlay): Promise<void> {
  const { services, sheetId, builder } = play;
  if (sheet.state === 'planned' || sheet.upTo === null) return;
  await services.start.start(builder, sheetId);
  const { steps } = await services.reading.details(builder, sheetId);
  const last = sheet.upTo.step;
  const count = steps.findIndex(({ code }) => code === last) + 1;
  if (count === 0) throw new Error(`${sheet.code} has no step ${last}.`);
  for (const [index, step] of steps.slice(0, count).entries()) {
    if (sheet.notDone?.includes(step.code)) continue;
    const share = (index + 1) / count;
    clock.moveTo(workingTime(today, sheet.begunDaysAgo, sheet.lastWorkedDaysAgo, share));
    await playOne(play, sheet, step);
  }
  await signUpTo(services, sheet, play);
}

async function playOne(play: Play, sheet: DemoSheet, step: StepDetail): Promise<void> {
  const { services, sheetId, person } = play;
  const { code } = step;
  const events = sheet.events.filter((event) => event.step === code);
  const uncritical = events.find((event) => event.what === 'uncritical');
  if (uncritical) {
    const { by, reason } = uncritical;
    await services.unmarking.unmark(person(by), sheetId, code, { reason });
  }
  const lastPull = sheet.upTo?.step === code ? sheet.upTo.pull : undefined;
  const isOpen = sheet.notCountersigned?.includes(code) ?? false;
  const left = events.some(({ what }) => what === 'left-open');
  const how: PlayedStep = {
    ...{ events, lastPull, readings: sheet.readings.find((each) => each.step === code) },
    isChecked: step.critical && !uncritical && !isOpen && !left && lastPull === undefined,
  };
  try {
    await playStep(play, step, how);
  } catch (error) {
    if (error instanceof HttpProblem)
      throw new Error(`${sheet.code}, step ${code}: ${error.detail}`, { cause: error });
    throw error;
  }
}

async function signUpTo(
  { signing }: SheetServices,
  { state }: DemoSheet,
  { sheetId, builder, second, person }: Play,
): Promise<void> {
  if (state === 'on-the-stand') return;
  await signing.signKnown(builder, sheetId, 'built');
  if (state === 'countersigning') return;
  await signing.signKnown(second, sheetId, 'countersigned');
  if (state === 'released') await signing.signKnown(person('nell'), sheetId, 'released');
}
