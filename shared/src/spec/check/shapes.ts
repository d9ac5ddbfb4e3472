import { InputError } from '../../contracts/input-error.js';
import type { Kind, Quantity } from '../../contracts/quantity.js';
import type { Limits, Source, Sourced } from '../../contracts/spec.js';
import { clip } from '../../quantities/clip.js';
import { toSi } from '../../quantities/convert.js';
import {
  requireList,
  requireNumber,
  requireOneOf,
  requireQuantity,
  requireRecord,
  requireText,
} from '../../quantities/require.js';

/** Reads an unknown input as one thing, or throws `InputError` with the path of what is wrong. */
export type Shape<T> = (input: unknown, path: string) => T;

const inside = (path: string, name: string): string => (path === '' ? name : `${path}.${name}`);

/** An object with these names and no others; a name whose shape takes `undefined` may be missing. */
export function object<T extends object>(fields: { readonly [K in keyof T]-?: Shape<T[K]> }): Shape<T> {
  const shapes = Object.entries<Shape<unknown>>(fields);
  return (input, path) => {
    const record = requireRecord(input, path === '' ? 'document' : path);
    const unknown = Object.keys(record).find((name) => !Object.hasOwn(fields, name));
    if (unknown !== undefined) {
      throw new InputError(inside(path, clip(unknown)), 'There is no such value in a spec.');
    }
    const read = shapes
      .map(([name, shape]) => [name, shape(record[name], inside(path, name))] as const)
      .filter(([, value]) => value !== undefined);
    return Object.fromEntries(read) as T;
  };
}

export const optional =
  <T>(shape: Shape<T>): Shape<T | undefined> =>
  (input, path) =>
    input === undefined ? undefined : shape(input, path);

export const list =
  <T>(shape: Shape<T>, options: { min?: number; max?: number } = {}): Shape<readonly T[]> =>
  (input, path) =>
    requireList(input, path, { max: 200, ...options }).map((item, index) => shape(item, `${path}[${index}]`));

/** An object of names that the writer chose, each with one kind of value. */
export const named =
  <T>(shape: Shape<T>): Shape<Readonly<Record<string, T>>> =>
  (input, path) =>
    Object.fromEntries(
      Object.entries(requireRecord(input, path)).map(([name, value]) => [
        name,
        shape(value, inside(path, name)),
      ]),
    );

export const text: Shape<string> = (input, path) => requireText(input, path, { max: 500 });

export const key: Shape<string> = (input, path) => {
  const found = requireText(input, path, { max: 60 });
  if (/^[a-z0-9]+(-[a-z0-9]+)*$/.test(found)) return found;
  throw new InputError(path, 'A key is small letters, figures and hyphens: head-nuts.');
};

export const number =
  (options: { min?: number; max?: number; integer?: boolean } = {}): Shape<number> =>
  (input, path) =>
    requireNumber(input, path, options);

export const trueOrFalse: Shape<boolean> = (input, path) => {
  if (typeof input === 'boolean') return input;
  throw new InputError(path, 'This must be true or false.');
};

export const oneOf =
  <T extends string | number>(words: readonly T[]): Shape<T> =>
  (input, path) =>
    requireOneOf(input, words, path);

export const quantity =
  (kind: Kind): Shape<Quantity> =>
  (input, path) =>
    requireQuantity(input, kind, path);

const limitsIn = (of: Shape<Quantity>): Shape<Limits> => {
  const shape = object<Limits>({ low: optional(of), high: optional(of) });
  return (input, path) => {
    const limits = shape(input, path);
    const { low, high } = limits;
    if (!low && !high) throw new InputError(path, 'Give at least one limit, low or high.');
    if (low && high && toSi(low) > toSi(high)) {
      throw new InputError(`${path}.low`, 'The low limit must not be above the high one.');
    }
    return limits;
  };
};

/** Limits of one kind of quantity; at least one of the two, the low one not above the high one. */
export const limits = (kind: Kind): Shape<Limits> => limitsIn(quantity(kind));

/** Limits in whatever kind of unit the first one has. */
export const anyLimits =
  (kindAt: (input: unknown, path: string) => Kind): Shape<Limits> =>
  (input, path) =>
    limits(kindAt(input, path))(input, path);

const sources: Readonly<Record<Source['kind'], Shape<Source>>> = {
  document: object<Extract<Source, { kind: 'document' }>>({
    kind: oneOf(['document']),
    document: text,
    edition: optional(text),
    page: optional(text),
  }),
  measured: object<Extract<Source, { kind: 'measured' }>>({
    kind: oneOf(['measured']),
    by: optional(text),
  }),
  'data-sheet': object<Extract<Source, { kind: 'data-sheet' }>>({
    kind: oneOf(['data-sheet']),
    document: text,
  }),
  'common-practice': object<Extract<Source, { kind: 'common-practice' }>>({
    kind: oneOf(['common-practice']),
  }),
};

const sourceKinds = ['document', 'measured', 'data-sheet', 'common-practice'] as const;

const source: Shape<Source> = (input, path) => {
  const { kind } = requireRecord(input, path);
  return sources[requireOneOf(kind, sourceKinds, `${path}.kind`)](input, path);
};

/** A value with where it comes from. */
export const sourced = <T>(shape: Shape<T>): Shape<Sourced<T>> =>
  object<Sourced<T>>({ value: shape, source: optional(source), note: optional(text) } as {
    readonly [K in keyof Sourced<T>]-?: Shape<Sourced<T>[K]>;
  });
