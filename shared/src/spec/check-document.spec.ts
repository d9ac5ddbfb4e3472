import { describe, expect, it } from 'vitest';
import at18 from '../../../test-data/specs/ok/at18.json' with { type: 'json' };
import orderTwice from '../../../test-data/specs/not-ok/firing-order-names-a-cylinder-twice.json' with { type: 'json' };
import torqueInMillimetres from '../../../test-data/specs/not-ok/torque-in-millimetres.json' with { type: 'json' };
import traceTooShort from '../../../test-data/specs/not-ok/trace-leaves-a-post-out.json' with { type: 'json' };
import { InputError } from '../contracts/input-error.js';
import { checkSpecDocument } from './check-document.js';

/** The demo document with one thing changed: a path of names and indexes, and what stands there. */
function changed(path: readonly (string | number)[], value: unknown): unknown {
  const copy = structuredClone(at18) as unknown;
  let at = copy as Record<string | number, unknown>;
  for (const name of path.slice(0, -1)) at = at[name] as Record<string | number, unknown>;
  const last = path.at(-1) ?? '';
  if (value === undefined) Reflect.deleteProperty(at, last);
  else at[last] = value;
  return copy;
}

function fieldOf(input: unknown): string {
  try {
    checkSpecDocument(input);
  } catch (error) {
    if (error instanceof InputError) return error.field;
    throw error;
  }
  return 'nothing';
}

describe('a spec document', () => {
  it('is taken as it is when everything in it is right', () => {
    expect(checkSpecDocument(at18)).toEqual(at18);
  });

  it.each([
    { what: 'an order that is none', input: orderTwice as unknown, field: 'engine.firingOrder.value' },
    { what: 'millimetres', input: torqueInMillimetres, field: 'fastenerGroups[11].torque.value.unit' },
    { what: 'half a trace', input: traceTooShort, field: 'ignition.trace.value' },
  ])('read from a file with $what is refused', ({ input, field }) => {
    expect(fieldOf(input)).toBe(field);
  });

  it.each([
    { what: 'no object', input: 'AT18', field: 'document' },
    { what: 'another format', input: changed(['format'], 2), field: 'format' },
    { what: 'a section missing', input: changed(['engine', 'bore'], undefined), field: 'engine.bore' },
    { what: 'an unknown name', input: changed(['engine', 'colour'], 'green'), field: 'engine.colour' },
    {
      what: 'a torque for a length',
      input: changed(['engine', 'bore', 'value', 'unit'], 'N·m'),
      field: 'engine.bore.value.unit',
    },
    {
      what: 'an unknown unit',
      input: changed(['engine', 'bore', 'value', 'unit'], 'cubits'),
      field: 'engine.bore.value.unit',
    },
    {
      what: 'a firing order that names a cylinder twice',
      input: changed(['engine', 'firingOrder', 'value'], [1, 3, 3, 2]),
      field: 'engine.firingOrder.value',
    },
    {
      what: 'banks that leave a cylinder out',
      input: changed(['engine', 'banks', 'value'], [[1, 2, 3]]),
      field: 'engine.banks.value',
    },
    {
      what: 'a first post that the cap has not',
      input: changed(['ignition', 'firstPost', 'value'], '90'),
      field: 'ignition.firstPost.value',
    },
    {
      what: 'a trace with two posts on one outlet',
      input: changed(['ignition', 'trace', 'value', 'C'], 'D'),
      field: 'ignition.trace.value',
    },
    {
      what: 'limits the wrong way round',
      input: changed(['ignition', 'pointsGap', 'value', 'low', 'value'], 0.5),
      field: 'ignition.pointsGap.value.low',
    },
    {
      what: 'limits of two kinds',
      input: changed(['measurements', 0, 'limits', 'value', 'high', 'unit'], 'N·m'),
      field: 'measurements[0].limits.value.high.unit',
    },
    {
      what: 'an order that leaves a fastener out',
      input: changed(['fastenerGroups', 11, 'sequence', 'value', 9], '1'),
      field: 'fastenerGroups[11].sequence.value',
    },
    {
      what: 'a pass that is nothing',
      input: changed(['fastenerGroups', 0, 'passes', 'value', 0], {}),
      field: 'fastenerGroups[0].passes.value[0]',
    },
    {
      what: 'an unknown kind of source',
      input: changed(['engine', 'name', 'source', 'kind'], 'hearsay'),
      field: 'engine.name.source.kind',
    },
    {
      what: 'a key used twice',
      input: changed(['measurements', 1, 'key'], 'bore-size'),
      field: 'measurements[1].key',
    },
    {
      what: 'too few valves',
      input: changed(['valveTrain', 'valveLayout', 'value'], ['inlet', 'exhaust', 'inlet']),
      field: 'valveTrain.valveLayout.value',
    },
  ])('with $what is refused, and the error says where', ({ input, field }) => {
    expect(fieldOf(input)).toBe(field);
  });
});
