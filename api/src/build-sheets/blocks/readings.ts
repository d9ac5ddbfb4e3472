import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { EntryView, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { MeasurementStep } from '@second-spanner/shared/contracts/steps';
import { drawToleranceBand, type BandReading } from '@second-spanner/shared/drawing/tolerance-band';
import { convert } from '@second-spanner/shared/quantities/convert';
import { printNumber } from '@second-spanner/shared/quantities/print';
import { uncertaintyAt } from '@second-spanner/shared/sheet/tools';
import { printLimits } from '@second-spanner/shared/spec/print-limits';
import { sourceText } from '@second-spanner/shared/spec/source-text';
import { draw, heightOf } from '../../paper/draw.js';
import type { Pages } from '../../paper/page.js';
import { table, type Column, type Row } from '../../paper/table.js';
import { initialled, type Wording } from '../words.js';
import { notes } from './notes.js';
import { stepTitle, under } from './title.js';

const bandWidth = 200;

/** A measurement with several places, or with a second person's readings: both side by side. */
export function readings(pages: Pages, step: StepDetail, words: Wording, tools: readonly Tool[]): void {
  if (step.definition.kind !== 'measurement') return;
  const { definition } = step;
  stepTitle(pages, step, words, 70);
  const told = `Limits ${printLimits(definition.limits)}. ${sourceText(definition.source)}.`;
  pages.paragraph(`${told}${step.covered ? '' : readBy(step, words)}`, { size: 8.5 });
  const band = bandOf(step, definition, tools);
  if (band) pages.need(heightOf(band, bandWidth));
  const top = pages.y;
  const width = pages.width - (band ? bandWidth + 16 : 0);
  const cells = definition.at.map((at) => cellsAt(step, at, words));
  const second = step.secondReadings.length > 0;
  table(pages, columnsOf(second, cells.length), rowsOf(cells, second ? 2 : 3), { x: pages.left, width });
  if (band) {
    draw(pages.document, band, pages.left + pages.width - bandWidth, top - 6, bandWidth);
    pages.y = Math.max(pages.y, top + heightOf(band, bandWidth) - 4);
  }
  under(pages, notes(step, words));
}

function columnsOf(second: boolean, places: number): readonly Column[] {
  const figures = { align: 'right', font: 'figures' } as const;
  const one: readonly Column[] = second
    ? [
        { head: 'Where' },
        { head: 'First', width: 66, ...figures },
        { head: 'Second, blind', width: 68, ...figures },
        { head: 'En', width: 34, ...figures },
      ]
    : [{ head: 'Where' }, { head: 'Read', width: 74, ...figures }];
  return Array.from({ length: Math.min(places, second ? 2 : 3) }, () => one).flat();
}

/** Lays the places out across the page, some to a row. */
function rowsOf(cells: readonly (readonly string[])[], across: number): readonly Row[] {
  const count = Math.ceil(cells.length / across);
  return Array.from({ length: count }, (_, index) => ({
    cells: cells.slice(index * across, (index + 1) * across).flat(),
  }));
}

function cellsAt(step: StepDetail, at: string, words: Wording): readonly string[] {
  const first = step.entries.find(
    ({ current, content }) => current && content.kind === 'measurement' && content.at === at,
  );
  const read = step.covered ? 'covered' : first ? words.read(first.content) : '';
  const second = secondOf(step);
  if (!second) return [words.say(at), read];
  const pair = second.agreement.rows.find(({ label }) => label === at);
  return [
    words.say(at),
    read,
    pair?.second ?? '',
    typeof pair?.en === 'number' ? printNumber(Math.abs(pair.en), 2) : '',
  ];
}

const secondOf = (step: StepDetail) => step.secondReadings.find(({ round }) => round === step.round);

/** Who read, and with what: once for all places where it is one person with one tool. */
function readBy({ entries }: StepDetail, words: Wording): string {
  const said = entries
    .filter(({ current }) => current)
    .map(
      ({ by, content }) =>
        `${initialled(by.name)} with ${content.kind === 'measurement' ? words.tool(content.toolId) : ''}`,
    );
  const all = [...new Set(said)];
  return all.length > 0 ? ` Read by ${all.join(', ')}.` : '';
}

function bandOf(step: StepDetail, { at, limits, unit }: MeasurementStep, tools: readonly Tool[]) {
  const first = step.entries.find(({ current }: EntryView) => current)?.content;
  const second = secondOf(step)?.content;
  if (at.length > 1 || first?.kind !== 'measurement' || !second || !('readings' in second)) return null;
  const again = second.readings[0];
  if (!again) return null;
  const reading = (value: Quantity, toolId: string, role: 'first' | 'second'): BandReading => {
    const tool = tools.find(({ id }) => id === toolId);
    const uncertainty = tool ? convert(uncertaintyAt(tool, value), unit).value : 0;
    return { value: convert(value, unit).value, uncertainty, role, label: role };
  };
  return drawToleranceBand({
    ...(limits.low && { low: convert(limits.low, unit).value }),
    ...(limits.high && { high: convert(limits.high, unit).value }),
    unit,
    readings: [reading(first.value, first.toolId, 'first'), reading(again.value, second.toolId, 'second')],
  });
}

/** Whether a measurement needs more than a row. */
export const needsTable = (step: StepDetail): boolean =>
  step.definition.kind === 'measurement' && (step.definition.at.length > 1 || step.secondReadings.length > 0);
