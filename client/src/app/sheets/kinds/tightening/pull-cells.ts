import type { TighteningStep } from '@second-spanner/shared/contracts/calculations';
import type { Unit } from '@second-spanner/shared/contracts/quantity';
import type { Tool, ToolKind } from '@second-spanner/shared/contracts/registers';
import type { TighteningStepDefinition } from '@second-spanner/shared/contracts/steps';
import { convert } from '@second-spanner/shared/quantities/convert';
import { printQuantity } from '@second-spanner/shared/quantities/print';
import { lastPass } from '@second-spanner/shared/sheet/plan-of';
import { printDay } from '../../../words/dates';
import { withCapital } from '../../entry-words';
import type { HeadCell } from '../../sheet/sheet-head';
import { limitsInWords } from '../../units/chosen-unit';

const kindWords: Partial<Record<ToolKind, string>> = {
  'click-wrench': 'click',
  'digital-wrench': 'digital',
  'dial-wrench': 'dial',
};

const conditionWords = {
  dry: 'dry',
  oiled: 'oiled',
  moly: 'moly grease',
  sealant: 'with sealant',
  'thread-lock': 'with thread-lock',
} as const;

export interface PullCells {
  readonly desk: readonly HeadCell[];
  readonly phone: readonly HeadCell[];
}

/** The cells in a tightening's head: aim, limits and thread on the desk; pass and wrench on the phone. */
export function pullCells(
  definition: TighteningStepDefinition | null,
  pull: TighteningStep | null,
  tool: Tool | undefined,
  unit: Unit,
): PullCells {
  if (definition === null) return { desk: [], phone: [] };
  const { group } = definition;
  const passes = lastPass(definition);
  const isLimited = pull?.low !== undefined || pull?.high !== undefined;
  return {
    desk: [
      aimCell(definition, pull, unit),
      ...(isLimited ? [{ caption: 'From, to', value: limitsInWords(pull, unit) }] : []),
      {
        caption: withCapital(`${group.noun}s`),
        value: `${group.thread.value}, ${conditionWords[group.condition.value]}`,
      },
    ],
    phone: [
      ...(pull !== null && passes > 1 ? [{ caption: 'Pass', value: `${pull.pass} of ${passes}` }] : []),
      wrenchCell(tool),
    ],
  };
}

function aimCell(
  { group, torque }: TighteningStepDefinition,
  pull: TighteningStep | null,
  unit: Unit,
): HeadCell {
  const value = printQuantity(convert(pull?.target ?? torque, unit));
  if (pull === null) return { caption: 'Torque', value };
  const caption = `Aim, ${group.noun} ${pull.fastener}`;
  return { caption, value: pull.angle === undefined ? value : `${pull.angle}° on` };
}

function wrenchCell(tool: Tool | undefined): HeadCell {
  if (tool === undefined) return { caption: 'Wrench', value: 'not chosen' };
  const kind = kindWords[tool.kind];
  return {
    caption: `Wrench ${tool.code}${kind === undefined ? '' : `, ${kind}`}`,
    value: `due ${printDay(tool.calibrationDue)}`,
  };
}
