import type { DrawingTable } from '@second-spanner/shared/drawing/shapes';
import type { AnswerPart } from '@second-spanner/shared/workings/working';

/**
 * Whether the facts and tables of an answer say in the same words what the table of a drawing says: each of its
 * rows within one of theirs, or a numbered list as one fact, such as `1 – 3 – 2 – 4`.
 */
export function saidAlready({ rows }: DrawingTable, parts: readonly AnswerPart[]): boolean {
  const said = parts.flatMap((part): readonly (readonly string[])[] => {
    if (part.kind === 'table') return part.rows;
    if (part.kind === 'facts') return part.facts.map(({ name, value, note = '' }) => [name, value, note]);
    return [];
  });
  const list = numberedList(rows);
  return (
    rows.every((row) => said.some((words) => row.every((cell) => words.includes(cell)))) ||
    (list !== null && said.some((words) => words.some((cell) => namesOf(cell) === list)))
  );
}

function numberedList(rows: DrawingTable['rows']): string | null {
  const isList = rows.every((row, index) => row.length === 2 && row[0] === `${index + 1}`);
  return isList ? rows.map(([, name]) => name).join(' ') : null;
}

/** The names of a list, whatever stands between them. */
const namesOf = (list: string): string => list.split(/[\s,–-]+/).join(' ');
