import {
  begunFrom,
  begunFromLength,
  type Working,
  type WorkingCase,
} from '@second-spanner/shared/workings/working';
import { badInput } from '../platform/errors/http-problem.js';

const mostNames = 100;
const mostBytes = 20_000;

/**
 * What was typed into a working, as it came from outside: texts, by the names of its fields. `path` goes before a
 * field's name in problems. What a case was begun from goes with every working.
 * Throws a 400 problem when it is too much, no text, or no field of the working.
 */
export function readTyped(
  working: Working,
  typed: Readonly<Record<string, unknown>>,
  path: string,
): WorkingCase {
  const named = working.sections.flatMap((section) => section.fields).map(({ name }) => name);
  const fields = new Set([begunFrom, ...named]);
  const entries = Object.entries(typed);
  const field = path.replace(/\.$/, '');
  if (entries.length > mostNames) throw badInput({ field, message: `At most ${mostNames} fields are kept.` });
  const texts = entries.map(([name, text]): [string, string] => {
    const at = `${path}${name.slice(0, 100)}`;
    if (!fields.has(name)) throw badInput({ field: at, message: 'This field is not known here.' });
    if (typeof text !== 'string') throw badInput({ field: at, message: 'This must be a text, given once.' });
    if (name === begunFrom && !isPlainLine(text)) throw badInput({ field: at, message: wrongLine });
    return [name, text];
  });
  const read = Object.fromEntries(texts);
  if (Buffer.byteLength(JSON.stringify(read)) > mostBytes) {
    throw badInput({ field, message: 'This is too much: a case has at most 20 kB.' });
  }
  return read;
}

const wrongLine = `This must be one line of at most ${begunFromLength} characters.`;
const isPlainLine = (text: string): boolean =>
  text.length <= begunFromLength && !/[\p{C}\p{Zl}\p{Zp}]/u.test(text);
