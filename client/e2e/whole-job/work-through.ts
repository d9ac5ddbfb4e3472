import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { NewEntryRequest, Sheet, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type {
  EntryContent,
  SecondReadingContent,
  TighteningStepDefinition,
} from '@second-spanner/shared/contracts/steps';
import { finalPass } from '@second-spanner/shared/sheet/plan-of';
import { slotKeyOf } from '@second-spanner/shared/sheet/slots';
import { finalTorque, goodContents, readers, watchedFasteners } from './demo-work.js';
import type { Hand } from './hand.js';

/** A sheet that two people work through, with the tools of their shop. */
export interface Work {
  readonly sheetId: string;
  readonly builder: Hand;
  readonly second: Hand;
  readonly tools: readonly Tool[];
}

const stepPath = ({ sheetId }: Work, code: string): string => `/sheets/${sheetId}/steps/${code}`;

/** Works every step that is not done yet, past the pages, up to the one named and without it; null: to the end. */
export async function workUpTo(work: Work, until: string | null): Promise<void> {
  const { stages } = await work.builder.get<Sheet>(`/sheets/${work.sheetId}`);
  const steps = stages.flatMap((stage) => stage.steps);
  const end = until === null ? steps.length : steps.findIndex(({ code }) => code === until);
  for (const { code, status } of steps.slice(0, end)) {
    if (status === 'done') continue;
    await workStep(work, code);
  }
}

async function workStep(work: Work, code: string): Promise<void> {
  const { definition, critical } = await work.builder.get<StepDetail>(stepPath(work, code));
  if (definition.kind === 'tightening' && critical) await workWatched(work, definition);
  else await checkRecorded(work, await record(work, code));
}

/** The second person reads the wrench before the last torque pass, and watches its pulls. */
async function workWatched(work: Work, definition: TighteningStepDefinition): Promise<void> {
  const { code } = definition;
  const final = finalPass(definition);
  await record(work, code, (content) => content.kind === 'tightening' && content.pass < final);
  const { secondReadings, round } = await work.builder.get<StepDetail>(stepPath(work, code));
  if (!secondReadings.some((reading) => reading.round === round)) {
    const content = settingSeen(definition, work.tools);
    await work.second.post(`${stepPath(work, code)}/second-readings`, { content });
  }
  await record(work, code);
  const pullsWitnessed = watchedFasteners(definition);
  await work.second.post(`${stepPath(work, code)}/countersignatures`, { outcome: 'agree', pullsWitnessed });
}

function settingSeen(definition: TighteningStepDefinition, tools: readonly Tool[]): SecondReadingContent {
  const pull = goodContents(definition, tools).find(
    (content) => content.kind === 'tightening' && content.pass === finalPass(definition),
  );
  const [toolId, set] = pull?.kind === 'tightening' ? [pull.toolId, pull.setting] : ['', undefined];
  return { kind: 'setting-and-pull-witnessed', toolId, setting: set ?? finalTorque(definition) };
}

/** The builder records what a step still wants, or of it what is wanted; what failed before is put right. */
export async function record(
  work: Work,
  code: string,
  isWanted: (content: EntryContent) => boolean = () => true,
): Promise<StepDetail> {
  let step = await work.builder.get<StepDetail>(stepPath(work, code));
  const current = step.entries.filter((entry) => entry.current);
  for (const content of goodContents(step.definition, work.tools).filter(isWanted)) {
    const held = current.find((entry) => slotKeyOf(entry.content) === slotKeyOf(content));
    if (held?.verdict === 'pass') continue;
    const correction = held && { replaces: held.id, reason: 'Put right, and read again.' };
    const request: NewEntryRequest = { content, ...correction };
    step = await work.builder.post<StepDetail>(`${stepPath(work, code)}/entries`, request);
  }
  return step;
}

/** The second person checks a critical step and countersigns it. */
export async function check(work: Work, code: string): Promise<void> {
  await checkRecorded(work, await work.builder.get<StepDetail>(stepPath(work, code)));
}

async function checkRecorded(work: Work, step: StepDetail): Promise<void> {
  const { code } = step;
  if (!step.critical || step.status === 'done') return;
  const content = readAgain(step, work.tools);
  await work.second.post(`${stepPath(work, code)}/second-readings`, { content });
  await work.second.post(`${stepPath(work, code)}/countersignatures`, { outcome: 'agree' });
}

/** What a second person finds who reads the same as the first. */
function readAgain({ definition, entries }: StepDetail, tools: readonly Tool[]): SecondReadingContent {
  const first = entries.filter(({ current }) => current).map(({ content }) => content);
  const [one] = first;
  if (definition.secondCheck === 'inspected' || one === undefined) {
    return { kind: 'inspected', outcome: 'pass', seen: definition.lookFor ?? [] };
  }
  if (one.kind === 'wiring') return { kind: 'read-again', fitted: one.fitted };
  if (one.kind === 'valve-timing') return { kind: 'read-again', sightings: one.sightings, about: one.about };
  if (definition.kind !== 'measurement' || one.kind !== 'measurement') {
    throw new Error(`Step ${definition.code} is not read again.`);
  }
  const readings = first.flatMap((content) =>
    content.kind === 'measurement' ? [{ at: content.at, value: content.value }] : [],
  );
  if (definition.secondCheck === 'strip-read-again') {
    return { kind: 'strip-read-again', toolId: one.toolId, readings };
  }
  const other = readers(definition, tools).find(({ id }) => id !== one.toolId);
  return { kind: 'measured-again', toolId: other?.id ?? one.toolId, readings };
}
