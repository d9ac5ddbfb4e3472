import type { WorkingCase } from '../working.js';
import { blankForm, valveFields, type WiringForm } from './wiring-form.js';

/** What reads one parameter of the address. */
export type ReadParameter = (name: string) => string | null;

/** The whole case as parameters of the address, readable; what is as on a blank page is left out. */
export function toQuery(form: WiringForm): Readonly<Record<string, string | null>> {
  const given = (value: string): string | null => (value.trim() === '' ? null : value.trim());
  const valves = valveFields.map((field) => form[field].trim());
  return {
    spec: given(form.spec),
    edition: given(form.edition),
    cylinders: given(form.cylinders),
    order: given(form.order),
    turns: given(form.turns),
    from: form.seenFrom,
    posts: form.spacing === 'typed' ? given(form.angles) : null,
    at: form.spacing === 'even' ? given(form.firstAngle) : null,
    first: given(form.first),
    intervals: given(form.intervals),
    trace: form.outlets === 'traced' ? pairsIn(form.trace) : null,
    beside: given(pairsIn(form.beside)),
    advance: given(form.advance),
    valves: valves.every((value) => value === '') ? null : valves.join('_'),
    fitted: given(pairsIn(form.fitted)),
  };
}

/** The same as the case of the working: only what is there. */
export function toCase(form: WiringForm): WorkingCase {
  return Object.fromEntries(
    Object.entries(toQuery(form)).filter((pair): pair is [string, string] => pair[1] !== null),
  );
}

/** The case that an address holds. What is missing is as on a blank page; what cannot be read stays as typed. */
export function fromQuery(read: ReadParameter): WiringForm {
  const text = (name: string, otherwise = ''): string => read(name) ?? otherwise;
  const turns = read('turns');
  const posts = read('posts');
  const trace = read('trace');
  const [ivo = '', ivc = '', evo = '', evc = ''] = text('valves').split('_');
  return {
    spec: text('spec'),
    edition: text('edition'),
    cylinders: text('cylinders', blankForm.cylinders),
    order: text('order'),
    turns: turns === 'clockwise' || turns === 'anticlockwise' ? turns : '',
    seenFrom: read('from') === 'drive' ? 'drive' : 'cap',
    spacing: posts === null ? 'even' : 'typed',
    firstAngle: text('at', blankForm.firstAngle),
    angles: posts ?? '',
    first: text('first'),
    intervals: text('intervals'),
    outlets: trace === null ? 'own' : 'traced',
    trace: pairsOf(trace ?? ''),
    beside: pairsOf(text('beside')),
    advance: text('advance', blankForm.advance),
    ivo,
    ivc,
    evo,
    evc,
    fitted: pairsOf(text('fitted')),
  };
}

/** `{A: '1', B: '3'}` as `A:1,B:3`. */
function pairsIn(pairs: Readonly<Record<string, string>>): string {
  return Object.entries(pairs)
    .filter(([, value]) => value !== '')
    .map((pair) => pair.join(':'))
    .join(',');
}

function pairsOf(text: string): Readonly<Record<string, string>> {
  return Object.fromEntries(
    text.split(',').flatMap((pair) => {
      const [name = '', value = ''] = pair.split(':').map((part) => part.trim());
      return name === '' || value === '' ? [] : [[name, value]];
    }),
  );
}
