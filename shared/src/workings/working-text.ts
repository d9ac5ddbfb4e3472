import { tradeText } from '../contracts/trade-words.js';
import {
  begunFrom,
  type AnswerPart,
  type CellField,
  type ChoiceField,
  type Working,
  type WorkingAnswer,
  type WorkingCase,
  type WorkingField,
  type WorkingOptions,
} from './working.js';
import { lowerFirst } from './lower-first.js';
import { judgementWord } from './judgement-words.js';
import { readRows } from './rows.js';
import { unitTaken } from './unit-taken.js';

export interface TypedLine {
  readonly label: string;
  readonly value: string;
}

/**
 * What the case was begun from and what was typed, as label and value, in the order of the page; fields left open
 * are not there.
 */
export function typedLines(working: Working, typed: WorkingCase): readonly TypedLine[] {
  const fields = working.sections
    .flatMap((section) => section.fields)
    .filter((field) => field.when?.(typed) !== false)
    .map((field) => ({ label: field.label, value: typedValue(field, typed[field.name] ?? '') }));
  return [{ label: 'Begun from', value: typed[begunFrom] ?? '' }, ...fields].filter(
    ({ value }) => value !== '',
  );
}

/** The value of a choice that says nothing, such as `not looked at`: it is left out with the fields left open. */
const nothingChosen = '-';

function typedValue(field: WorkingField, text: string): string {
  if (field.kind === 'choice') {
    const value = text === '' ? field.starts : text;
    if (value === nothingChosen) return '';
    return field.choices.find((choice) => choice.value === value)?.words ?? value;
  }
  return text === '' ? '' : writtenValue(field, text);
}

function writtenValue(field: Exclude<WorkingField, ChoiceField>, text: string): string {
  switch (field.kind) {
    case 'quantity':
      return /^[^a-zµ°Ω"']*$/i.test(text) ? `${text} ${unitTaken(field, text)}` : text;
    case 'number':
      return (text + (field.counts === '°' ? '°' : ` ${field.counts}`)).trim();
    case 'turn':
      return `${text}°`;
    case 'rows':
      return readRows(
        text,
        field.columns.map(({ name }) => name),
      )
        .map((row) =>
          field.columns
            .map((column) => typedCell(column, row[column.name] ?? '', field.columns))
            .filter((cell) => cell !== '')
            .join(', '),
        )
        .join('; ');
    case 'text':
      return field.says?.(text) ?? text;
    default:
      return text;
  }
}

/** A cell of a row, with its column's name where the value alone does not tell what it is. */
function typedCell(column: CellField, text: string, columns: readonly CellField[]): string {
  const value = typedValue(column, text);
  const isBare =
    (column.kind === 'text' && column.figures === true) ||
    (column.kind === 'number' && column.counts === '') ||
    (column.kind === 'quantity' && columns.filter(({ kind }) => kind === 'quantity').length > 1);
  return value !== '' && isBare && columns.length > 1 ? `${lowerFirst(column.label)} ${value}` : value;
}

/** The whole working as plain text, to be copied or mailed. `address` opens the same case again. */
export function workingText(
  working: Working,
  typed: WorkingCase,
  answer: WorkingAnswer,
  options: WorkingOptions & { readonly address?: string },
): string {
  const lines = [
    working.title,
    ...typedLines(working, typed).map(({ label, value }) => `${label}: ${value}`),
    '',
    ...answer.parts.flatMap((part) => partLines(part)),
    ...listed('Assumed', answer.assumed),
    ...listed('Take care', answer.cautions),
    ...listed('Worked out by', answer.basis),
    ...(options.address === undefined ? [] : ['', options.address]),
  ];
  return tradeText(lines.join('\n'), options.dialect);
}

const listed = (what: string, lines: readonly string[]): readonly string[] =>
  lines.map((line) => `${what}: ${line}`);

function partLines(part: AnswerPart): readonly string[] {
  switch (part.kind) {
    case 'judgement':
      return [`${part.of === undefined ? '' : `${part.of}. `}${judgementWord(part)}: ${part.reason}`];
    case 'facts':
      return part.facts.map(
        ({ name, value, note }) => `${name}: ${value}${note === undefined ? '' : ` (${note})`}`,
      );
    case 'table':
      return [
        part.heading,
        part.columns.map(({ name }) => name).join(' | '),
        ...part.rows.map((row) => row.join(' | ')),
      ];
    case 'steps':
      return [part.heading, ...part.steps.map((step, i) => `${i + 1}. ${step}`)];
    case 'drawing':
      return [];
  }
}
