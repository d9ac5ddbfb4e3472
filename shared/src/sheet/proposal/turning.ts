import type { SpecDocument } from '../../contracts/spec.js';
import { check, readAt, reading, type Draft } from './draft.js';

const turns =
  'Two full turns by hand the way the engine runs; write the torque that breaks it away and the torque that keeps it moving beside the last. A jump or a tight spot is a {snag}.';

interface Turning {
  /** What was just tightened: `main cap 2`. */
  readonly of: string;
  readonly after: readonly string[];
}

/** Two full turns after something was tightened: read against the spec's limit for it, or only felt for. */
export function turning(document: SpecDocument, key: string, { of, after }: Turning): Draft {
  const spec = readAt(document, 'running-torque').find((each) => each.key === key);
  const title = `Two full turns after ${of}`;
  return spec
    ? reading(spec, { title, words: turns, after, which: of })
    : check({ id: `turned:${key}:${of}`, title, instruction: turns, after });
}
