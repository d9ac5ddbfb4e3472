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

/** The cells in a tightening's head: aim, limits and thread on the desk; pass and wrench on the phone. */
export function pullCells(
  definition: TighteningStepDefinition | null,
  pull: TighteningStep | null,
  tool: Tool | undefined,
  unit: Unit,
  isEntering: boolean,
): { readonly desk: readonly HeadCell[]; readonly phone: readonly HeadCell[] } {
  if (definition === null) return { desk: [], phone: [] };
  const { group } = definition;
  const thread = `${group.thread.value}, ${conditionWords[group.condition.value]}`;
  const passes = lastPass(definition);
  const torque = pull?.target ?? definition.torque;
  return {
    desk: [
      pull?.angle === undefined
        ? {
            caption: isEntering ? `Aim, ${group.noun} ${pull?.fastener ?? ''}` : 'Torque',
            value: printQuantity(convert(torque, unit)),
          }
        : { caption: `Aim, ${group.noun} ${pull.fastener}`, value: `${pull.angle}° on` },
      ...(pull?.low !== undefined || pull?.high !== undefined
        ? [{ caption: 'From, to', value: limitsInWords(pull, unit) }]
        : []),
      { caption: withCapital(`${group.noun}s`), value: thread },
    ],
    phone: [
      ...(pull !== null && passes > 1 ? [{ caption: 'Pass', value: `${pull.pass} of ${passes}` }] : []),
      tool === undefined
        ? { caption: 'Wrench', value: 'not chosen' }
        : {
            caption: `Wrench ${tool.code}, ${kindWords[tool.kind] ?? ''}`,
            value: `due ${printDay(tool.calibrationDue)}`,
          },
    ],
  };
}
