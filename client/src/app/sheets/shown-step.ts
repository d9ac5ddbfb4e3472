import type { EntryView, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { Judgement } from '@second-spanner/shared/contracts/verdict';
import { InputError } from '@second-spanner/shared/contracts/input-error';
import type { Judge } from '@second-spanner/shared/sheet/judge-of';
import type { JudgingContext } from '@second-spanner/shared/sheet/judging-context';
import type { TrayItem } from '../offline/tray-item';

/** An entry as the page shows it: one that the api has, or one that still lies in the tray on this device. */
export interface ShownEntry extends EntryView {
  readonly inTray: { readonly seq: number; readonly refused: string | null } | null;
}

/** A step with what lies in the tray for it laid over it, so that work goes on without a network. */
export interface ShownStep extends Omit<StepDetail, 'entries'> {
  readonly entries: readonly ShownEntry[];
}

/** What judges the waiting entries on this device; without a judge, as long as it is being downloaded, they are not judged. */
export interface JudgingHere extends Pick<JudgingContext, 'tools'> {
  readonly judge: Judge | null;
}

/** Lays the waiting entries of a step over what the api has of it. A refused one is shown, but counts for nothing. */
export function shownStep(
  step: StepDetail,
  items: readonly TrayItem[],
  by: PersonName,
  judging: JudgingHere,
): ShownStep {
  const waiting = items.filter(({ refused }) => refused === undefined);
  const replacedBy = new Map(
    waiting.flatMap(({ key, request }) =>
      request.replaces === undefined ? [] : [[request.replaces, key] as const],
    ),
  );
  const known = step.entries.map((entry): ShownEntry => {
    const later = replacedBy.get(entry.id);
    return later === undefined
      ? { ...entry, inTray: null }
      : { ...entry, replacedBy: later, current: false, inTray: null };
  });
  return {
    ...step,
    entries: [...known, ...items.map((item) => fromTray(item, step, by, judging, replacedBy))],
  };
}

function fromTray(
  item: TrayItem,
  step: StepDetail,
  by: PersonName,
  judging: JudgingHere,
  replacedBy: ReadonlyMap<string, string>,
): ShownEntry {
  const { request, refused, keptAt } = item;
  return {
    id: item.key,
    content: request.content,
    ...judgedHere(item, step, judging),
    by,
    at: keptAt,
    round: step.round,
    replaces: request.replaces ?? null,
    replacedBy: replacedBy.get(item.key) ?? null,
    replaceReason: request.reason ?? null,
    current: refused === undefined && !replacedBy.has(item.key),
    inTray: { seq: item.seq, refused: refused ?? null },
  };
}

/** The page's own judgement, until the api's is there. */
function judgedHere(
  { request, keptAt }: TrayItem,
  step: StepDetail,
  { judge, tools }: JudgingHere,
): Judgement {
  if (judge === null) return { verdict: 'not-judged', reason: 'It is judged when it is sent.' };
  try {
    return judge(step.definition, request.content, { tools, on: keptAt.slice(0, 10) });
  } catch (error) {
    if (error instanceof InputError) return { verdict: 'not-judged', reason: error.message };
    throw error;
  }
}
