import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { formula } from '../measuring/formula/formula.js';
import { refuseName } from '../measuring/formula/readings-by-name.js';
import { parseQuantity } from '../quantities/parse.js';
import { printQuantity } from '../quantities/print.js';
import { readUnit } from '../quantities/unit-names.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { anyFigure } from './measuring/fields.js';
import { bandPart, figureIf } from './measuring/figures.js';
import type { CaseReader } from './read-case.js';
import { writeRows } from './rows.js';

/** Arithmetic on readings by name, with their units. */
export const formulaWorking = defineWorking({
  key: 'formula',
  group: 'measuring',
  title: 'Formula',
  asks: 'What does a sum of several readings come to, with their units?',
  sections: [
    {
      heading: 'The formula',
      fields: [
        {
          kind: 'text',
          name: 'formula',
          label: 'Formula',
          hint: 'bore_min − journal_max: names, numbers, + − × ÷ and brackets',
          figures: true,
        },
        {
          kind: 'rows',
          name: 'readings',
          label: 'Readings by name',
          row: 'reading',
          least: 1,
          most: 40,
          columns: [
            { kind: 'text', name: 'name', label: 'Name', hint: 'bore_min', figures: true },
            anyFigure('value', 'Reading with its unit', { hint: '50.04 mm' }),
          ],
        },
        { kind: 'text', name: 'unit', label: 'Unit of the answer', hint: 'mm, thou, N·m', figures: true },
      ],
    },
    {
      heading: 'The limits',
      fields: [
        anyFigure('low', 'Least', { optional: 'no least' }),
        anyFigure('high', 'Most', { optional: 'no most' }),
        anyFigure('uncertainty', 'The answer may be out by', {
          hint: 'either way, from all its readings together',
          optional: 'nothing: the figure as worked out decides',
        }),
      ],
    },
  ],
  example: {
    typed: {
      formula: '0.00075 × journal',
      readings: writeRows([{ name: 'journal', value: '60 mm' }], ['name', 'value']),
      unit: 'µm',
    },
    from: 'least clearance of a bearing maker’s bulletin, 0.00075 for each unit of the shaft: 45 µm for 60 mm',
  },
  basis: [
    'Arithmetic, worked out in SI with each figure’s kind: a length is never added to a torque, nor to a plain number.',
  ],
  fieldOf: [
    [/^limits\.low/, 'low'],
    [/^limits\.high/, 'high'],
    [/^limits/, 'low'],
    [/^(formula|unit|uncertainty|low|high)\b/, '$1'],
  ],
  answer: (read, options): WorkedOut => {
    const unit = readUnit(read.text('unit'));
    if (unit === undefined) throw new InputError('unit', 'Write a unit such as mm, thou or N·m.');
    const low = figureIf(read, 'low', unit);
    const high = figureIf(read, 'high', unit);
    const uncertainty = figureIf(read, 'uncertainty', unit);
    const limits = { ...(low && { low }), ...(high && { high }) };
    const readings = readReadings(read);
    const { verdict, reason, value, uses } = formula({
      ...{ formula: read.text('formula'), readings, unit, limits, uncertainty },
    });
    const unused = Object.keys(readings).filter((name) => !uses.includes(name));
    return {
      parts: [
        ...(Object.keys(limits).length === 0 ? [] : [{ kind: 'judgement', verdict, reason } as const]),
        {
          kind: 'facts',
          facts: [
            { name: 'It comes to', value: printQuantity(value) },
            ...uses.map((name) => ({ name, value: printQuantity(readings[name] ?? value) })),
          ],
        },
        ...bandPart('The answer on its band', limits, [{ value, uncertainty, label: 'answer' }], options),
      ],
      assumed: [
        ...(uncertainty === undefined ? ['The readings are taken to be right.'] : []),
        ...unused.map((name) => `${name} is not used by the formula.`),
      ],
    };
  },
});

function readReadings(read: CaseReader): Readonly<Record<string, Quantity>> {
  const readings = new Map<string, Quantity>();
  read.rows('readings').forEach((row, i) => {
    const [name, path] = [row.text('name').trim(), `readings.${i}`];
    refuseName(name, `${path}.name`);
    if (readings.has(name)) throw new InputError(`${path}.name`, `There is already a reading “${name}”.`);
    const value = parseQuantity(row.text('value'), undefined, `${path}.value`);
    if (value.unit === '°C' || value.unit === '°F' || value.unit === 'K') {
      throw new InputError(`${path}.value`, 'A temperature cannot stand in a formula.');
    }
    readings.set(name, value);
  });
  return Object.fromEntries(readings);
}
