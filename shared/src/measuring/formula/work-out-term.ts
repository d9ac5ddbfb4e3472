import { InputError } from '../../contracts/input-error.js';
import { areAlike, combine, nameOf, plainNumber, type Dimensions } from './dimensions.js';
import type { Term } from './parse-formula.js';

/** A figure in SI. */
export interface Figure {
  readonly value: number;
  readonly dimensions: Dimensions;
  /** The largest figure that went into it, for what rounding leaves behind. */
  readonly size: number;
}

type Operation = Extract<Term, { kind: 'operation' }>;

/** Works a formula out over figures by name. Throws `InputError` on `formula`. */
export function workOutTerm(term: Term, readings: ReadonlyMap<string, Figure>): Figure {
  switch (term.kind) {
    case 'number':
      return { value: term.value, dimensions: plainNumber, size: Math.abs(term.value) };
    case 'reading': {
      const figure = readings.get(term.name);
      if (figure === undefined) throw new InputError('formula', noReading(term.name, [...readings.keys()]));
      return figure;
    }
    case 'minus': {
      const figure = workOutTerm(term.of, readings);
      return { ...figure, value: -figure.value };
    }
    case 'operation': {
      const figure = operate(term, workOutTerm(term.left, readings), workOutTerm(term.right, readings));
      if (Number.isFinite(figure.value)) return figure;
      throw new InputError('formula', 'These figures give no number: something is divided by nothing.');
    }
  }
}

function noReading(name: string, known: readonly string[]): string {
  const there = known.slice(0, 8).join(', ');
  return `There is no reading “${name.slice(0, 40)}”; there are: ${there === '' ? 'none' : there}.`;
}

function operate({ by }: Operation, left: Figure, right: Figure): Figure {
  switch (by) {
    case 'multiply':
      return {
        value: left.value * right.value,
        dimensions: combine(left.dimensions, right.dimensions, 1),
        size: left.size * right.size,
      };
    case 'divide':
      return {
        value: left.value / right.value,
        dimensions: combine(left.dimensions, right.dimensions, -1),
        size: left.size / Math.abs(right.value),
      };
    case 'add':
    case 'subtract':
      return together(left, right, by === 'add' ? 1 : -1);
  }
}

function together(left: Figure, right: Figure, sign: 1 | -1): Figure {
  if (!areAlike(left.dimensions, right.dimensions)) {
    const [a, b] = [nameOf(left.dimensions), nameOf(right.dimensions)];
    throw new InputError('formula', `Only like adds to like: here ${a} and ${b} do not go together.`);
  }
  return {
    value: left.value + sign * right.value,
    dimensions: left.dimensions,
    size: Math.max(left.size, right.size),
  };
}
