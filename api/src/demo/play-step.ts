import { randomUUID } from 'node:crypto';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { finalPass } from '@second-spanner/shared/sheet/plan-of';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { SheetServices } from '../sheets/sheet-services.js';
import { firstContents, leads, measurements, type DemoFiller } from './demo-contents.js';
import { eventOf, isOf, withFigure, type EventOf, type PlayedStep } from './demo-events.js';
import { secondReading, watched } from './demo-second.js';
import type { DemoSettlement, Values } from './demo-sheet-file.js';

/** A sheet being played, and what its steps are played with. */
export interface Play extends DemoFiller {
  readonly services: SheetServices;
  readonly sheetId: string;
  readonly builder: SignedIn;
  readonly second: SignedIn;
  readonly person: (key: string) => SignedIn;
}

/** Plays one step: records it, lets what went wrong go wrong, and has it checked by the second person. */
export async function playStep(play: Play, step: StepDetail, how: PlayedStep): Promise<void> {
  const { definition } = step;
  const contents = firstContents(definition, play, how);
  const raised = eventOf(how, 'raised');
  const disagreement = eventOf(how, 'disagreement');
  const watchedFrom = eventOf(how, 'uncritical') ? -1 : firstWatched(step, contents);
  if (watchedFrom >= 0) {
    // The setting is read before the pulls that are watched.
    await record(play, step, contents.slice(0, watchedFrom), how);
    await readAgain(play, step, contents);
    await record(play, step, contents.slice(watchedFrom), how);
  } else {
    await record(play, step, contents, how);
    if (raised) await raise(play, step.code, raised);
    const correction = eventOf(how, 'correction');
    const corrected = contents.map((content) =>
      correction && isOf(content, correction) ? withFigure(content, correction.then) : content,
    );
    if (how.isChecked) await readAgain(play, step, corrected, disagreement?.second);
  }
  if (disagreement) await redo(play, step, disagreement);
  if (how.isChecked) await countersign(play, step);
}

/** Where the pulls begin that a second person watches; −1 where none are. */
function firstWatched({ definition, critical }: StepDetail, contents: readonly EntryContent[]): number {
  if (!critical || definition.kind !== 'tightening') return -1;
  const final = finalPass(definition);
  return contents.findIndex((each) => each.kind === 'tightening' && each.pass === final);
}

/** Records contents in their order; a wrong one is corrected at once. */
async function record(
  play: Play,
  { code, definition }: StepDetail,
  contents: readonly EntryContent[],
  how: PlayedStep,
): Promise<void> {
  const { services, sheetId, builder } = play;
  const correction = eventOf(how, 'correction');
  const rewired = definition.kind === 'wiring' ? eventOf(how, 'wired-wrong') : undefined;
  const wrongAt = contents.findIndex(
    (content) => rewired !== undefined || (correction && isOf(content, correction)),
  );
  const wrong = contents[wrongAt];
  const keep = (some: readonly EntryContent[]): Promise<string[]> =>
    services.entries.recordAll(
      builder,
      sheetId,
      code,
      some.map((content) => ({ content })),
    );
  if (!wrong) {
    if (contents.length > 0) await keep(contents);
    return;
  }
  const first = correction ? withFigure(wrong, correction.first) : wrong;
  const ids = await keep([...contents.slice(0, wrongAt), first]);
  const then: EntryContent = correction
    ? withFigure(wrong, correction.then)
    : { kind: 'wiring', fitted: definition.kind === 'wiring' ? leads(definition) : {} };
  const reason = correction?.reason ?? rewired?.reason ?? '';
  const replaces = ids.at(-1) ?? '';
  await services.entries.recordAll(builder, sheetId, code, [{ content: then, replaces, reason }]);
  const rest = contents.slice(wrongAt + 1);
  if (rest.length > 0) await keep(rest);
}

async function readAgain(
  { services, sheetId, second, tools, sightings }: Play,
  { code, definition }: StepDetail,
  first: readonly EntryContent[],
  written?: Values,
): Promise<void> {
  const content = secondReading(definition, first, tools, sightings, written);
  await services.secondReadings.keep(second, sheetId, code, { content }, randomUUID());
}

async function countersign(
  { services, sheetId, second }: Play,
  { code, definition }: StepDetail,
): Promise<void> {
  const request = { outcome: 'agree', pullsWitnessed: watched(definition) } as const;
  await services.countersigning.countersign(second, sheetId, code, request, randomUUID());
}

/** What the two read differently is settled by a third, and read again by both. */
async function redo(
  play: Play,
  step: StepDetail,
  { again, unit, settled }: EventOf<'disagreement'>,
): Promise<void> {
  const { services, sheetId, builder, tools } = play;
  await settle(play, step.code, settled);
  if (step.definition.kind !== 'measurement') return;
  const contents = measurements(step.definition, tools, again, unit);
  const requests = contents.map((content) => ({ content }));
  await services.entries.recordAll(builder, sheetId, step.code, requests);
  await readAgain(play, step, contents);
}

async function raise(play: Play, code: string, raised: EventOf<'raised'>): Promise<void> {
  const { services, sheetId, person } = play;
  await services.snags.raise(person(raised.by), sheetId, code, { words: raised.words });
  if (raised.settled) await settle(play, code, raised.settled);
}

async function settle(
  { services, sheetId, person }: Play,
  code: string,
  { by, how, reason }: DemoSettlement,
): Promise<void> {
  const { snags } = await services.reading.step(person(by), sheetId, code);
  const open = snags.find(({ settled }) => settled === null);
  if (!open) throw new Error(`Step ${code} has no open snag to settle.`);
  await services.snags.settle(person(by), sheetId, open.id, { how, reason });
}
