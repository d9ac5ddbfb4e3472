import type { CapMap } from '@second-spanner/shared/contracts/calculations';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { drawCap } from '@second-spanner/shared/drawing/cap';
import { capMap } from '@second-spanner/shared/ignition/cap-map';
import { diagnoseWiring } from '@second-spanner/shared/sheet/judge-wiring';
import { draw, heightOf } from '../../paper/draw.js';
import type { Pages } from '../../paper/page.js';
import { table } from '../../paper/table.js';
import type { BuildSheet } from '../build-sheet.js';
import type { Wording } from '../words.js';
import { notes } from './notes.js';
import { stepTitle, under } from './title.js';

const columns = [
  { head: 'Post', width: 44, font: 'figures' },
  { head: 'Outlet', width: 44, font: 'figures' },
  { head: 'Should be', width: 54, font: 'figures' },
  { head: 'Fitted', width: 44, font: 'figures' },
  { head: 'Fires at', width: 52, font: 'figures' },
  { head: 'Judged' },
] as const;

/** The wiring map as a drawing, with the leads as they were found. */
export function wiring(pages: Pages, step: StepDetail, words: Wording, build: BuildSheet): void {
  if (step.definition.kind !== 'wiring') return;
  const { definition } = step;
  const map = capMap(definition.cap);
  const content = step.entries.find(({ current }) => current)?.content;
  const fitted = content?.kind === 'wiring' ? content.fitted : undefined;
  const drawing = drawCap(
    {
      map,
      request: definition.cap,
      showRequired: true,
      ...(fitted && { fitted, fittedBy: 'outlet' as const, diagnosis: diagnoseWiring(definition, fitted) }),
    },
    { dialect: build.dialect },
  );
  const width = 230;
  stepTitle(pages, step, words, heightOf(drawing, width) + 30);
  const top = pages.y;
  draw(pages.document, drawing, pages.left, top, width);
  const area = { x: pages.left + width + 14, width: pages.width - width - 14 };
  const named = columns.map((column) =>
    column.head === 'Outlet' ? { ...column, head: words.say('{Outlet}') } : column,
  );
  table(pages, named, rows(map, fitted), area);
  const turns = words.say(definition.cap.rotation === 'clockwise' ? 'clockwise' : '{anticlockwise}');
  const from = definition.cap.rotationSeenFrom ?? 'cap';
  pages.y += pages.text(
    `Firing order ${definition.cap.firingOrder.join('-')}. The rotor turns ${turns}, seen from the ${from}.`,
    area.x,
    pages.y,
    { size: 8, width: area.width },
  );
  pages.y = Math.max(pages.y + 4, top + heightOf(drawing, width) + 4);
  under(pages, notes(step, words));
}

function rows(map: CapMap, fitted: Readonly<Record<string, number | string>> | undefined) {
  return map.rows.map(({ angle, outlet, cylinder, firesAt }) => {
    const found = fitted?.[outlet];
    return {
      cells: [
        `${angle}°`,
        outlet,
        String(cylinder),
        found === undefined ? '' : String(found),
        `${firesAt}°`,
        found === undefined
          ? ''
          : { sign: String(found) === String(cylinder) ? ('pass' as const) : ('fail' as const) },
      ],
    };
  });
}
