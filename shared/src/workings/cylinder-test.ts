import type { Cylinder } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import type { CylinderReading, CylinderTestRequest } from '../contracts/measuring.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import type { SpecDocument } from '../contracts/spec.js';
import { cylinderTest } from '../measuring/cylinder-test.js';
import { parseQuantity } from '../quantities/parse.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { cylinderFields } from './cylinder-test-fields.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { percent } from './fastening/figures.js';
import type { CaseReader } from './read-case.js';
import { writeRows } from './rows.js';
import type { AnswerPart, WorkingCase } from './working.js';

const columns = ['cylinder', 'dry', 'wet', 'bank'] as const;

/** A compression or leak-down test, and what it points at. */
export const cylinderTestWorking = defineWorking({
  key: 'cylinder-test',
  group: 'measuring',
  title: 'Compression and leak-down',
  asks: 'Are the cylinders even, and what do the low ones point at?',
  sections: cylinderFields,
  example: {
    typed: {
      test: 'compression',
      gauge: 'psi',
      readings: writeRows(
        [
          { cylinder: '1', dry: '150' },
          { cylinder: '2', dry: '148' },
          { cylinder: '3', dry: '105', wet: '140' },
          { cylinder: '4', dry: '149' },
        ],
        columns,
      ),
    },
    from: 'made up: lowest at 70 % of the highest, by the rule of three quarters, which is common practice',
  },
  basis: [
    'Even when the lowest is at least three quarters of the highest, or the share that was typed: common practice, no source.',
    'Oil that raises a low cylinder by a tenth or more points at its rings, else at valves or gasket: common practice, no source.',
    'A leak is only compared through the same orifice at the same supply pressure.',
  ],
  fieldOf: [
    [/^readings\[(\d+)\]\.(cylinder|dry|wet|bank)/, 'readings.$1.$2'],
    [/^readings\[(\d+)\]/, 'readings.$1.cylinder'],
    [/^mostLeakAt\.orifice/, 'limitOrifice'],
    [/^mostLeakAt/, 'limitSupply'],
    [/^(leastShare|mostLeak|orifice|supply)/, '$1'],
  ],
  fromSpec: cylinderCases,
  answer: (read): WorkedOut => {
    const request = requestOf(read);
    const answer = cylinderTest(request);
    return {
      parts: [
        { kind: 'judgement', verdict: answer.verdict, reason: answer.reason },
        {
          kind: 'facts',
          facts: [
            { name: 'Lowest', value: `cylinder ${answer.lowest}` },
            { name: 'Highest', value: `cylinder ${answer.highest}` },
            ...(answer.share === null ? [] : [{ name: 'Lowest over highest', value: percent(answer.share) }]),
          ],
        },
        ...(answer.findings.length === 0
          ? []
          : [
              {
                kind: 'steps',
                heading: 'What it points at',
                steps: answer.findings.map(({ reason }) => reason),
              } as const,
            ]),
        tableOf(request),
      ],
      assumed: assumedOf(request),
      cautions: answer.cautions,
    };
  },
});

function requestOf(read: CaseReader): CylinderTestRequest {
  const test = read.choice<CylinderTestRequest['test']>('test');
  const [orifice, supply] = [read.quantityIf('orifice'), read.quantityIf('supply')];
  const [limitOrifice, limitSupply] = [read.quantityIf('limitOrifice'), read.quantityIf('limitSupply')];
  const share = read.numberIf('leastShare');
  if (share !== undefined && share > 100) throw new InputError('leastShare', 'This is at most 100 %.');
  return {
    test,
    readings: read.rows('readings').map((row, i) => readingOf(row, i, test, read)),
    ...(share === undefined ? {} : { leastShare: share / 100 }),
    mostLeak: read.numberIf('mostLeak'),
    rebuilt: read.choice('rebuilt') === 'yes',
    orifice,
    supply,
    ...(limitOrifice === undefined || limitSupply === undefined
      ? {}
      : { mostLeakAt: { orifice: limitOrifice, supply: limitSupply } }),
  };
}

function readingOf(
  row: CaseReader,
  i: number,
  test: CylinderTestRequest['test'],
  read: CaseReader,
): CylinderReading {
  const figure = (name: 'dry' | 'wet', text: string): Quantity | number =>
    test === 'leak-down'
      ? percentOf(text, `readings.${i}.${name}`)
      : parseQuantity(text, read.choice<Unit & ('bar' | 'psi' | 'kPa')>('gauge'), `readings.${i}.${name}`);
  const wet = row.textIf('wet');
  return {
    cylinder: cylinderOf(row.text('cylinder')),
    dry: figure('dry', row.text('dry')),
    ...(wet === undefined ? {} : { wet: figure('wet', wet) }),
    ...(row.textIf('bank') === undefined ? {} : { bank: row.textIf('bank') }),
  };
}

const cylinderOf = (text: string): Cylinder => (/^\d{1,3}$/.test(text) ? Number(text) : text);

function percentOf(text: string, field: string): number {
  const match = /^(\d{1,3}(?:[.,]\d{1,6})?)\s*%?$/.exec(text.trim());
  if (match?.[1] === undefined) throw new InputError(field, 'Write the percent lost, such as 12.');
  return Number(match[1].replace(',', '.'));
}

function tableOf({ readings }: CylinderTestRequest): AnswerPart {
  const print = (figure: Quantity | number | undefined): string => {
    if (figure === undefined) return '–';
    return typeof figure === 'number' ? `${printNumber(figure, 1)} %` : printQuantity(figure);
  };
  return {
    kind: 'table',
    heading: 'Readings',
    columns: [{ name: 'Cylinder' }, { name: 'Dry', figures: true }, { name: 'With oil', figures: true }],
    rows: readings.map(({ cylinder, dry, wet }) => [String(cylinder), print(dry), print(wet)]),
  };
}

function assumedOf({ test, leastShare, readings }: CylinderTestRequest): readonly string[] {
  const isBanked = readings.some(({ bank }) => bank !== undefined);
  return [
    ...(test === 'compression' && leastShare === undefined
      ? ['75 % of the highest still counts as even.']
      : []),
    ...(isBanked ? [] : ['The cylinders stand side by side in the order of the list.']),
  ];
}

function cylinderCases({
  engine,
}: SpecDocument): readonly { readonly name: string; readonly typed: WorkingCase }[] {
  const banks = engine.banks.value;
  const rows = banks.flatMap((bank, i) =>
    bank.map((cylinder) => ({
      cylinder: String(cylinder),
      ...(banks.length > 1 ? { bank: `bank ${i + 1}` } : {}),
    })),
  );
  return [{ name: engine.name.value, typed: { test: 'compression', readings: writeRows(rows, columns) } }];
}
