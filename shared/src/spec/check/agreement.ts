import { InputError } from '../../contracts/input-error.js';
import type { FastenerLayout } from '../../contracts/calculations.js';
import type { EngineSection, FastenerGroup, IgnitionSection, SpecDocument } from '../../contracts/spec.js';

/** What must hold between values that are each right by themselves. Throws `InputError`. */
export function checkAgreement(document: SpecDocument): void {
  checkEngine(document.engine);
  checkIgnition(document.ignition, document.engine.cylinders.value);
  checkValves(document);
  for (const [index, group] of document.fastenerGroups.entries()) {
    checkGroup(group, `fastenerGroups[${index}]`);
  }
  for (const part of ['fastenerGroups', 'measurements', 'keys', 'compounds'] as const) {
    checkKeys(document[part], part);
  }
  for (const [index, { at }] of document.measurements.entries()) {
    refuseRepeats(at, `measurements[${index}].at`);
  }
}

function checkEngine({ cylinders, firingOrder, banks }: EngineSection): void {
  const count = cylinders.value;
  if (!isEachOnce(firingOrder.value, count)) {
    throw new InputError(
      'engine.firingOrder.value',
      `The firing order must name each cylinder from 1 to ${count} once.`,
    );
  }
  if (!isEachOnce(banks.value.flat(), count)) {
    throw new InputError(
      'engine.banks.value',
      `The banks must name each cylinder from 1 to ${count} once between them.`,
    );
  }
}

const isEachOnce = (numbers: readonly number[], count: number): boolean =>
  numbers.length === count && new Set(numbers).size === count && numbers.every((each) => each <= count);

function checkIgnition({ posts, firstPost, trace }: IgnitionSection, cylinders: number): void {
  const names = posts.value.map(({ post }) => post);
  if (names.length !== cylinders) {
    throw new InputError(
      'ignition.posts.value',
      `The cap must have a post for each of the ${cylinders} cylinders.`,
    );
  }
  refuseRepeats(names, 'ignition.posts.value');
  if (!names.includes(firstPost.value)) {
    throw new InputError('ignition.firstPost.value', `The posts are ${names.join(', ')}.`);
  }
  if (!trace) return;
  const traced = Object.keys(trace.value);
  if (traced.length !== names.length || !names.every((name) => traced.includes(name))) {
    throw new InputError('ignition.trace.value', 'The trace must name every post of the cap.');
  }
  refuseRepeats(Object.values(trace.value), 'ignition.trace.value');
}

function checkValves({ engine, valveTrain }: SpecDocument): void {
  const valves = valveTrain.valveLayout.value;
  if (valves.length % engine.cylinders.value !== 0) {
    throw new InputError(
      'valveTrain.valveLayout.value',
      `${valves.length} valves do not share out over ${engine.cylinders.value} cylinders.`,
    );
  }
}

/** The names of a group's fasteners: those of a pattern are numbered from 1. */
function fastenersOf(layout: FastenerLayout): readonly string[] {
  if ('positions' in layout) return layout.positions.map(({ fastener }) => fastener);
  const count = layout.pattern === 'grid' ? layout.rows * layout.columns : layout.count;
  return Array.from({ length: count }, (_, index) => String(index + 1));
}

function checkGroup({ layout, sequence, repeats }: FastenerGroup, path: string): void {
  const fasteners = fastenersOf(layout);
  refuseRepeats(fasteners, `${path}.layout.positions`);
  if (repeats) refuseRepeats(repeats, `${path}.repeats`);
  if (!sequence) return;
  const inOrder = [...sequence.value].sort().join();
  if (inOrder !== [...fasteners].sort().join()) {
    throw new InputError(
      `${path}.sequence.value`,
      `The order must name each fastener once: ${fasteners.join(', ')}.`,
    );
  }
}

function checkKeys(items: readonly { readonly key: string }[], path: string): void {
  const seen = new Set<string>();
  for (const [index, { key }] of items.entries()) {
    if (seen.has(key)) throw new InputError(`${path}[${index}].key`, `${key} is there already.`);
    seen.add(key);
  }
}

function refuseRepeats(names: readonly string[], path: string): void {
  const twice = names.find((name, index) => names.indexOf(name) !== index);
  if (twice !== undefined) throw new InputError(path, `${twice} is there twice.`);
}
