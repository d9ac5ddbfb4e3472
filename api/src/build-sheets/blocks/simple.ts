import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { printQuantity } from '@second-spanner/shared/quantities/print';
import type { SignKind } from '@second-spanner/shared/drawing/signs';
import { printLimits } from '@second-spanner/shared/spec/print-limits';
import { sourceText } from '@second-spanner/shared/spec/source-text';
import type { Pages } from '../../paper/page.js';
import { table, type Cell, type Row } from '../../paper/table.js';
import { people, type Wording } from '../words.js';
import { notes } from './notes.js';

const columns = [
  { head: 'Step', width: 34, font: 'figures' },
  { head: 'What' },
  { head: 'Read', width: 78, align: 'right' },
  { head: 'Limits', width: 92, align: 'right' },
  { head: 'Source', width: 84 },
  { head: 'Judged', width: 62 },
  { head: 'By, second person', width: 78 },
] as const;

/** Steps that are told in a row each. */
export function simpleSteps(pages: Pages, steps: readonly StepDetail[], words: Wording): void {
  if (steps.length === 0) return;
  table(
    pages,
    columns,
    steps.map((step) => rowOf(step, words)),
  );
}

function rowOf(step: StepDetail, words: Wording): Row {
  return {
    cells: [
      step.code,
      words.say(step.title),
      readOf(step, words),
      limitsOf(step),
      step.definition.source || step.kind === 'measurement' ? sourceText(step.definition.source) : '',
      judged(step),
      people(step),
    ],
    under: notes(step, words),
  };
}

function readOf(step: StepDetail, words: Wording): string {
  if (step.covered) return 'covered';
  const current = step.entries.filter((entry) => entry.current);
  if (step.kind === 'photo') return current.length === 1 ? '1 photo' : `${current.length} photos`;
  return current.map(({ content }) => words.read(content)).join(', ');
}

function limitsOf({ definition }: StepDetail): string {
  if (definition.kind === 'measurement') return printLimits(definition.limits);
  if (definition.kind === 'tightening') return printQuantity(definition.torque);
  return '';
}

/** The verdict of a step as it stands, with its sign. */
export function judged(step: StepDetail): Cell {
  return { sign: signOf(step) };
}

function signOf(step: StepDetail): SignKind {
  if (step.status === 'done') return 'pass';
  if (step.covered) return 'waiting';
  const current = step.entries.filter((entry) => entry.current);
  if (current.some(({ verdict }) => verdict === 'fail')) return 'fail';
  if (current.some(({ verdict }) => verdict === 'doubtful')) return 'doubtful';
  return step.hold ? 'hold' : 'waiting';
}
