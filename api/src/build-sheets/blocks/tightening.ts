import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { TighteningStepDefinition } from '@second-spanner/shared/contracts/steps';
import { drawTightening, fastenerPositions } from '@second-spanner/shared/drawing/tightening';
import { convert } from '@second-spanner/shared/quantities/convert';
import { printNumber, printQuantity } from '@second-spanner/shared/quantities/print';
import { planOf } from '@second-spanner/shared/sheet/plan-of';
import { sourceText } from '@second-spanner/shared/spec/source-text';
import { draw, heightOf } from '../../paper/draw.js';
import type { Pages } from '../../paper/page.js';
import { table, type Row } from '../../paper/table.js';
import type { BuildSheet } from '../build-sheet.js';
import type { Wording } from '../words.js';
import { notes } from './notes.js';
import { stepTitle, under } from './title.js';

const drawingWidth = 205;
const across = 10;

/** A tightening with more than one fastener: the order as a drawing, every pull in a table. */
export function tightening(pages: Pages, step: StepDetail, words: Wording, build: BuildSheet): void {
  if (step.definition.kind !== 'tightening') return;
  const { definition } = step;
  const plan = planOf(definition);
  const drawing = drawTightening(
    {
      plan,
      positions: fastenerPositions(definition.plan.fasteners),
      outline: definition.group.outline,
      title: definition.title,
    },
    { dialect: build.dialect },
  );
  const drawn = heightOf(drawing, drawingWidth);
  stepTitle(pages, step, words, drawn + 30);
  const top = pages.y;
  draw(pages.document, drawing, pages.left, top, drawingWidth);
  const x = pages.left + drawingWidth + 16;
  const area = { x, width: pages.width - drawingWidth - 16 };
  for (const part of parts(plan.sequence)) {
    table(pages, columnsFor(definition, part), rowsFor(step, definition, part), area);
  }
  pages.y +=
    pages.text(words.say(describe(step, definition, words)), x, pages.y, { size: 8, width: area.width }) + 4;
  pages.y = Math.max(pages.y, top + drawn + 4);
  under(pages, notes(step, words));
}

function parts(sequence: readonly string[]): readonly (readonly string[])[] {
  const count = Math.ceil(sequence.length / across);
  return Array.from({ length: count }, (_, index) => sequence.slice(index * across, (index + 1) * across));
}

const columnsFor = ({ group }: TighteningStepDefinition, part: readonly string[]) => [
  { head: group.noun },
  ...part.map((fastener) => ({
    head: fastener,
    width: 27,
    align: 'right' as const,
    font: 'figures' as const,
  })),
];

function rowsFor(
  step: StepDetail,
  definition: TighteningStepDefinition,
  part: readonly string[],
): readonly Row[] {
  const { steps } = planOf(definition);
  const passes = [...new Set(steps.map(({ pass }) => pass))];
  return passes.map((pass) => {
    const planned = steps.find((each) => each.pass === pass);
    const name =
      planned?.angle !== undefined
        ? `turn ${planned.angle}°`
        : planned?.target
          ? `to ${printQuantity(planned.target)}`
          : `pass ${pass}`;
    return { cells: [name, ...part.map((fastener) => figureAt(step, definition, pass, fastener))] };
  });
}

function figureAt(
  step: StepDetail,
  definition: TighteningStepDefinition,
  pass: number,
  fastener: string,
): string {
  if (step.covered) return '–';
  const content = step.entries.find(
    (entry) =>
      entry.current &&
      entry.content.kind === 'tightening' &&
      entry.content.pass === pass &&
      entry.content.fastener === fastener,
  )?.content;
  if (content?.kind !== 'tightening') return '';
  if (content.angle !== undefined) return `${content.angle}°`;
  const shown = content.reading ?? content.setting;
  return shown ? printNumber(convert(shown, definition.torque.unit).value, 1) : '';
}

function describe(step: StepDetail, definition: TighteningStepDefinition, words: Wording): string {
  const { plan, group, torque, source } = definition;
  const { tolerance } = plan;
  const limits = tolerance
    ? `, from ${printQuantity(tolerance.low)} below to ${printQuantity(tolerance.high)} above`
    : '';
  const pulls = step.entries.map(({ content }) => content).filter((content) => content.kind === 'tightening');
  const wrenches = [...new Set(pulls.map(({ toolId }) => words.tool(toolId)))].filter(Boolean);
  const how = pulls.some(({ setting }) => setting)
    ? 'wrench set to the figure and pulled to its click'
    : 'readings of the wrench';
  const used = wrenches.length > 0 && !step.covered ? ` Wrench ${wrenches.join(', ')}: ${how}.` : '';
  return `In ${torque.unit}. Final ${printQuantity(torque)}${limits}. ${group.thread.value}, ${group.condition.value}. ${planOf(definition).reason}${used} ${sourceText(source)}.`;
}

/** Whether a tightening needs more than a row. */
export const hasOrder = (step: StepDetail): boolean =>
  step.definition.kind === 'tightening' && planOf(step.definition).steps.length > 1;
