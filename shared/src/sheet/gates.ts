import type { StepStatus, WaitsFor } from '../contracts/sheets.js';
import type { StepDefinition } from '../contracts/steps.js';
import { isRecorded, type StepFacts } from './facts.js';

/** A step with what is known of it; `critical` may have been unmarked since the sheet was laid out. */
export interface GateStep {
  readonly definition: Pick<StepDefinition, 'code' | 'title' | 'restsOn' | 'hold'>;
  readonly critical: boolean;
  readonly facts: StepFacts;
}

/** Recorded, without an open snag, and countersigned where it is critical. */
export const isDone = ({ critical, facts }: Pick<GateStep, 'critical' | 'facts'>): boolean =>
  isRecorded(facts) && facts.openSnags === 0 && (!critical || facts.countersigned);

/** The status of every step, in the sheet's order. */
export function stepStatuses(steps: readonly GateStep[]): readonly StepStatus[] {
  const done = new Set(steps.filter(isDone).map(({ definition }) => definition.code));
  let held = false;
  return steps.map((step) => {
    const status = statusOf(step, done, held);
    if (step.definition.hold && status !== 'done') held = true;
    return status;
  });
}

function statusOf(step: GateStep, done: ReadonlySet<string>, held: boolean): StepStatus {
  const { definition, facts } = step;
  if (done.has(definition.code)) return 'done';
  if (facts.openSnags > 0) return 'snag';
  if (isRecorded(facts) && step.critical) return 'to-countersign';
  if (held || definition.restsOn.some((code) => !done.has(code))) return 'waiting';
  return facts.done > 0 || facts.verdict !== null ? 'in-hand' : 'open';
}

/**
 * What a step waits for, with a sentence for each; empty when it may be worked.
 * @param secondPerson the name of the sheet's second person, for the sentences
 */
export function waitsFor(
  steps: readonly GateStep[],
  code: string,
  secondPerson: string,
): readonly WaitsFor[] {
  const at = steps.findIndex(({ definition }) => definition.code === code);
  const step = steps[at];
  if (!step || isDone(step)) return [];
  const byCode = new Map(steps.map((each) => [each.definition.code, each]));
  const rests = step.definition.restsOn
    .map((rest) => byCode.get(rest))
    .filter((rest) => rest !== undefined)
    .filter((rest) => !isDone(rest));
  const holds = steps.slice(0, at).filter((each) => each.definition.hold && !isDone(each));
  return [
    ...holds.map((hold) => ({
      what: 'hold' as const,
      code: hold.definition.code,
      sentence: isRecorded(hold.facts)
        ? `Hold point ${hold.definition.code}, ${hold.definition.title}, waits for ${secondPerson}.`
        : `Hold point ${hold.definition.code}, ${hold.definition.title}, must be done and countersigned first.`,
      person: secondPerson,
    })),
    ...rests
      .filter((rest) => !rest.definition.hold)
      .map((rest) => ({
        what: 'step' as const,
        code: rest.definition.code,
        sentence: sentenceFor(rest, secondPerson),
        ...(isRecorded(rest.facts) && { person: secondPerson }),
      })),
    ...ownWaits(step, secondPerson),
  ];
}

function sentenceFor(rest: GateStep, secondPerson: string): string {
  const name = `${rest.definition.code}, ${rest.definition.title}`;
  if (rest.facts.openSnags > 0) return `It rests on ${name}, which has an open {snag}.`;
  if (isRecorded(rest.facts)) return `It rests on ${name}, which waits for ${secondPerson}.`;
  return `It rests on ${name}, which is not done.`;
}

function ownWaits(step: GateStep, secondPerson: string): readonly WaitsFor[] {
  if (step.facts.openSnags > 0) {
    return [
      { what: 'snag', code: step.definition.code, sentence: 'An open {snag} on this step must be settled.' },
    ];
  }
  if (isRecorded(step.facts) && step.critical) {
    return [
      {
        what: 'second-check',
        code: step.definition.code,
        sentence: `It is recorded and waits for ${secondPerson}.`,
        person: secondPerson,
      },
    ];
  }
  return [];
}

/** The code of the first step in order that may be worked now. */
export function nextStep(steps: readonly GateStep[]): string | null {
  const statuses = stepStatuses(steps);
  const at = statuses.findIndex((status) => status === 'open' || status === 'in-hand');
  return steps[at]?.definition.code ?? null;
}

/** Whether entries may be made on a step: nothing before it is missing, and no disagreement on it is open. */
export function mayRecord(steps: readonly GateStep[], code: string, openDisagreement: boolean): boolean {
  if (openDisagreement || !steps.some(({ definition }) => definition.code === code)) return false;
  return waitsFor(steps, code, '').every(({ what }) => what === 'snag' || what === 'second-check');
}
