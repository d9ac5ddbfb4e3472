import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import type { CellField, RowsField, TurnField, WorkingCase, WorkingField } from './working.js';
import { parseQuantity } from '../quantities/parse.js';
import { requireQuantity } from '../quantities/require.js';
import { readRows } from './rows.js';
import { unitTaken } from './unit-taken.js';

/** The fields of a case as values. A field that is asked for must be of the kind that its name says. */
export interface CaseReader {
  /** Of a field that may not stay empty. */
  readonly quantity: (name: string) => Quantity;
  readonly number: (name: string) => number;
  readonly text: (name: string) => string;
  /** Of a field that may stay empty. */
  readonly quantityIf: (name: string) => Quantity | undefined;
  readonly numberIf: (name: string) => number | undefined;
  readonly textIf: (name: string) => string | undefined;
  /** What stands chosen. */
  readonly choice: <T extends string>(name: string) => T;
  /** The rows that are not wholly empty. */
  readonly rows: (name: string) => readonly CaseReader[];
}

export interface CaseReading {
  readonly errors: Readonly<Record<string, string>>;
  /** Labels of what may not stay empty and is. */
  readonly missing: readonly string[];
  /** What was read into a text that left it open. */
  readonly assumed: readonly string[];
  readonly reader: CaseReader;
}

type Value = Quantity | number | string;

/** Reads every field of a case, and says of each what is wrong with it. */
export function readCase(fields: readonly WorkingField[], typed: WorkingCase): CaseReading {
  const errors: Record<string, string> = {};
  const missing: string[] = [];
  const assumed: string[] = [];
  const reader = readFields(fields, typed, '', { errors, missing, assumed });
  return { errors, missing, assumed, reader };
}

interface Findings {
  readonly errors: Record<string, string>;
  readonly missing: string[];
  readonly assumed: string[];
}

function readFields(
  fields: readonly WorkingField[],
  typed: WorkingCase,
  path: string,
  findings: Findings,
): CaseReader {
  const values = new Map<string, Value>();
  const lists = new Map<string, readonly CaseReader[]>();
  for (const field of fields) {
    if (field.when?.(typed) === false) continue;
    const text = (typed[field.name] ?? '').trim();
    if (field.kind === 'rows') {
      lists.set(field.name, readList(field, text, `${path}${field.name}`, findings));
      continue;
    }
    const value = readValue(field, text, `${path}${field.name}`, findings);
    if (value !== undefined) values.set(field.name, value);
    else if (text === '' && field.optional === undefined && !findings.missing.includes(field.label)) {
      findings.missing.push(field.label);
    }
  }
  return readerOf(values, lists);
}

function readList(field: RowsField, text: string, path: string, findings: Findings): readonly CaseReader[] {
  const columns = field.columns.map(({ name }) => name);
  const rows = readRows(text, columns).map((row, i) => ({ row, path: `${path}.${i}.` }));
  const filled = rows.filter(({ row }) => isFilled(row, field.columns));
  if (filled.length < field.least && field.optional === undefined) findings.missing.push(field.label);
  if (rows.length > field.most) {
    findings.errors[path] = `At most ${field.most} here; there are ${rows.length}.`;
    return [];
  }
  return filled.map(({ row, path: at }) => readFields(field.columns, row, at, findings));
}

/** A row whose choices alone are set is still empty: they are never without a value. */
const isFilled = (row: WorkingCase, columns: readonly CellField[]): boolean =>
  columns.some(
    ({ name, kind }) =>
      (row[name] ?? '') !== '' && (kind !== 'choice' || columns.every((c) => c.kind === 'choice')),
  );

function readValue(
  field: Exclude<WorkingField, RowsField>,
  text: string,
  path: string,
  { errors, assumed }: Findings,
): Value | undefined {
  if (field.kind === 'choice') return readChoice(field, text, path, errors);
  if (text === '') return undefined;
  try {
    switch (field.kind) {
      case 'quantity': {
        const { signed: negative, interval } = field;
        const unit = unitTaken(field, text);
        const read = requireQuantity(parseQuantity(text, unit, path), field.of, path, { negative, interval });
        if (unit !== field.unit) assumed.push(`${text} was taken as inches.`);
        return read;
      }
      case 'number':
        return readPlain(text, path, field.signed === true);
      case 'turn':
        return around(field, readPlain(text, path, true));
      case 'text':
      case 'date':
      case 'moment':
        return text;
    }
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    errors[path] = error.message;
    return undefined;
  }
}

function readChoice(
  field: Extract<CellField, { kind: 'choice' }>,
  text: string,
  path: string,
  errors: Record<string, string>,
): string {
  const value = text === '' ? field.starts : text;
  if (field.choices.some((choice) => choice.value === value)) return value;
  errors[path] = `Choose one of: ${field.choices.map(({ words }) => words).join(', ')}.`;
  return field.starts;
}

/** The angle that a value outside the field's ends comes to, whole turns of them on or back: −10° is 710° of 720. */
function around({ from, to }: TurnField, value: number): number {
  if (value >= from && value <= to) return value;
  const turn = to - from;
  return from + ((((value - from) % turn) + turn) % turn);
}

/** A number with a decimal point or comma, a fraction such as `1/64`, or a ratio such as `9:1`. */
function readPlain(text: string, path: string, signed: boolean): number {
  const match = /^([+\-−]?)(\d+(?:[.,]\d+)?|[.,]\d+)(?: ?[/:] ?(\d+(?:[.,]\d+)?))?\s*[°%]?$/.exec(text);
  const of = (digits: string | undefined): number => Number((digits ?? '1').replace(',', '.'));
  const value = match === null ? NaN : of(match[2]) / of(match[3]);
  if (!Number.isFinite(value) || Math.abs(value) > 1e9) {
    throw new InputError(path, 'Write a number, such as 12.5 or 12,5.');
  }
  const isNegative = match?.[1] === '-' || match?.[1] === '−';
  if (isNegative && value !== 0 && !signed) throw new InputError(path, 'This cannot be negative.');
  return isNegative ? -value : value;
}

function readerOf(
  values: ReadonlyMap<string, Value>,
  lists: ReadonlyMap<string, readonly CaseReader[]>,
): CaseReader {
  const optional = (name: string): Value | undefined => values.get(name);
  const needed = (name: string): Value => {
    const value = values.get(name);
    if (value === undefined) throw new Error(`The case has no ${name}.`);
    return value;
  };
  return {
    quantity: (name) => needed(name) as Quantity,
    number: (name) => needed(name) as number,
    text: (name) => needed(name) as string,
    quantityIf: (name) => optional(name) as Quantity | undefined,
    numberIf: (name) => optional(name) as number | undefined,
    textIf: (name) => optional(name) as string | undefined,
    choice: <T extends string>(name: string) => needed(name) as T,
    rows: (name) => lists.get(name) ?? [],
  };
}
