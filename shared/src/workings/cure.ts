import type { Cure, CurePoint, CureRequest } from '../contracts/curing.js';
import type { CompoundSpec, SpecDocument } from '../contracts/spec.js';
import { cure, notYet } from '../curing/cure.js';
import { requireMoment, sayMoment } from '../curing/moments.js';
import { drawCureCurve } from '../drawing/cure-curve.js';
import { cureFields, sheetColumns } from './cure-fields.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { percent, typed } from './fastening/figures.js';
import type { CaseReader } from './read-case.js';
import { writeRows } from './rows.js';
import type { AnswerPart, WorkingCase } from './working.js';

const columns = sheetColumns.map(({ name }) => name);

/** When a joint with a compound in it may be loaded. */
export const cureWorking = defineWorking({
  key: 'cure',
  group: 'curing',
  title: 'Curing',
  asks: 'When may the joint be handled and loaded, and has the compound set?',
  sections: cureFields,
  example: {
    typed: {
      sheet: writeRows([{ temperature: '10 °C', toLoad: '72 h', full: '72 h' }], columns),
      ...{ temperature: '50 °F', applied: '2026-12-01T08:00', now: '2026-12-02T08:00' },
    },
    from: 'an anaerobic compound without heat at 50 °F, 72 h to full strength: TM 5-3820-256-24-5, page 129',
  },
  basis: [
    'Between two temperatures of the data sheet the times are taken on a straight line, which errs late; for gaps the next larger one listed, for humidity the next lower. Own rule.',
    'Temperatures on the way: each stretch uses up its length over the time that the sheet gives, the slower of the two temperatures at its ends. Own rule, erring late.',
  ],
  fieldOf: [
    [/^sheet\[(\d+)\]\.(\w+)/, 'sheet.$1.$2'],
    [/^sheet\[(\d+)\]/, 'sheet.$1.temperature'],
    [/^log\[(\d+)\]\.(at|temperature)/, 'log.$1.$2'],
    [/^(temperature|gap|substrate|humidity|openTime|lotExpires|applied|closed|now|log|sheet)/, '$1'],
  ],
  fromSpec: compoundCases,
  answer: (read, options): WorkedOut => {
    const request = requestOf(read);
    const answer = cure(request);
    const drawing = drawCureCurve(request, answer, options);
    return {
      parts: [
        judgementOf(answer),
        ...factsOf(request, answer),
        ...(drawing === null
          ? []
          : [
              {
                kind: 'drawing',
                caption: 'How far it has set; the hatched time is still to wait',
                drawing,
              } as const,
            ]),
      ],
      assumed: assumedOf(request),
      cautions: [
        ...(answer.cautions ?? []),
        'Surfaces must be as clean and dry as the data sheet asks: nothing here can tell.',
      ],
    };
  },
});

/** A joint that only needs more time has failed nothing. */
function judgementOf({ verdict, reason }: Cure): AnswerPart {
  return reason.startsWith(notYet)
    ? { kind: 'judgement', verdict, waits: true, word: 'Not yet', reason: reason.slice(notYet.length) }
    : { kind: 'judgement', verdict, reason };
}

function requestOf(read: CaseReader): CureRequest {
  const log = read
    .rows('log')
    .map((row) => ({ at: row.text('at'), temperature: row.quantity('temperature') }));
  return {
    sheet: read.rows('sheet').map(pointOf),
    temperature: read.quantity('temperature'),
    gap: read.quantityIf('gap'),
    substrate: read.textIf('substrate'),
    activator: read.choice('activator') === 'yes',
    humidity: read.numberIf('humidity'),
    lotExpires: read.textIf('lotExpires'),
    applied: read.text('applied'),
    closed: read.textIf('closed'),
    openTime: read.quantityIf('openTime'),
    now: read.text('now'),
    ...(log.length === 0 ? {} : { log }),
    retorqueAllowed: read.choice('retorque') === 'yes',
  };
}

function pointOf(row: CaseReader): CurePoint {
  return {
    temperature: row.quantity('temperature'),
    gap: row.quantityIf('gap'),
    substrate: row.textIf('substrate'),
    activator: row.choice('activator') === 'yes',
    humidity: row.numberIf('humidity'),
    toHandle: row.quantityIf('toHandle'),
    toLoad: row.quantity('toLoad'),
    full: row.quantity('full'),
  };
}

function factsOf({ applied }: CureRequest, answer: Cure): readonly AnswerPart[] {
  const style = requireMoment(applied, 'applied');
  const one = (name: string, iso: string | undefined): readonly { name: string; value: string }[] =>
    iso === undefined ? [] : [{ name, value: sayMoment(requireMoment(iso, 'applied').at, style) }];
  const facts = [
    ...one('May be handled from', answer.handleAt),
    ...one('May be loaded from', answer.loadAt),
    ...one('Full strength from', answer.fullAt),
    ...(answer.progress === undefined
      ? []
      : [{ name: 'Of the way to loading', value: percent(answer.progress) }]),
  ];
  return facts.length === 0 ? [] : [{ kind: 'facts', facts }];
}

function assumedOf({ closed, openTime, lotExpires, log }: CureRequest): readonly string[] {
  return [
    ...(closed === undefined ? ['The joint was closed when the compound was applied.'] : []),
    ...(openTime === undefined ? ['How long it may stay open is not checked.'] : []),
    ...(lotExpires === undefined ? ['The lot is taken to be in date.'] : []),
    ...(log === undefined ? ['The parts keep one temperature throughout.'] : []),
    'All times are of one clock that was not put forward or back in between.',
  ];
}

function compoundCases({
  compounds,
}: SpecDocument): readonly { readonly name: string; readonly typed: WorkingCase }[] {
  return compounds.map((compound) => ({
    name: `${compound.name}: ${compound.use}`,
    typed: { sheet: sheetTyped(compound), openTime: typed(compound.openTime.value) },
  }));
}

function sheetTyped({ curePoints }: CompoundSpec): string {
  const rows = curePoints.value.map(({ temperature, gap, toHandle, toLoad, full }) => ({
    temperature: typed(temperature),
    ...(gap && { gap: typed(gap) }),
    ...(toHandle && { toHandle: typed(toHandle) }),
    toLoad: typed(toLoad),
    full: typed(full),
  }));
  return writeRows(rows, columns);
}
