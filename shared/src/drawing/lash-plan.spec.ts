import { describe, expect, it } from 'vitest';
import type { LashOrderRequest, ListedValve } from '../contracts/valve-figures.js';
import { lashOrder } from '../valve-train/lash-order.js';
import { allShapes, partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawLashPlan } from './lash-plan.js';
import type { Drawing } from './shapes.js';

const valveTiming = { ivo: 10, ivc: 50, evo: 50, evc: 10 };

function valvesOf(cylinders: number, each: string): readonly ListedValve[] {
  const letters = [...each];
  return Array.from({ length: cylinders * letters.length }, (_, i) => ({
    valve: String(i + 1),
    cylinder: Math.floor(i / letters.length) + 1,
    type: letters[i % letters.length] === 'E' ? 'exhaust' : 'inlet',
  }));
}

const orders: Readonly<Record<number, readonly number[]>> = {
  1: [1],
  4: [1, 3, 4, 2],
  6: [1, 5, 3, 6, 2, 4],
  8: [1, 8, 4, 3, 6, 5, 7, 2],
  12: [1, 7, 5, 11, 3, 9, 6, 12, 2, 8, 4, 10],
  16: Array.from({ length: 16 }, (_, i) => i + 1),
};

function drawn(cylinders: number, each = 'EI', more: Partial<LashOrderRequest> = {}): Drawing {
  const firingOrder = orders[cylinders] ?? [];
  const request = { firingOrder, valveTiming, valves: valvesOf(cylinders, each), ...more };
  return drawLashPlan({ request, plan: lashOrder(request) });
}

describe.each([
  [1, 'EI'],
  [4, 'EI'],
  [6, 'EI'],
  [8, 'EI'],
  [12, 'EI'],
  [16, 'EEII'],
])('of %d cylinders with %s', (cylinders, each) => {
  const drawing = drawn(cylinders, each);

  it('can be read, with nothing cut off', () => {
    expect(unreadable(drawing)).toEqual([]);
    const circles = allShapes(drawing).filter((shape) => shape.kind === 'circle');
    for (const { centre, radius } of circles) {
      expect(Math.min(centre.x, centre.y) - radius).toBeGreaterThanOrEqual(0);
      expect(centre.x + radius).toBeLessThanOrEqual(drawing.width);
      expect(centre.y + radius).toBeLessThanOrEqual(drawing.height);
    }
  });

  it('has each valve in hand at the stop where the plan sets it', () => {
    const request = { firingOrder: orders[cylinders] ?? [], valveTiming, valves: valvesOf(cylinders, each) };
    const { stops } = lashOrder(request);
    stops.forEach(({ set }, i) => {
      const now = request.valves
        .filter(({ valve }) =>
          partsOf(drawing, `stop:${i + 1}:${valve}`).some((shape) => 'pen' in shape && shape.pen === 'oxide'),
        )
        .map(({ valve }) => valve);
      expect(now).toEqual(set);
    });
    expect(drawing.table.rows.map(([, , set]) => set)).toEqual(stops.map(({ set }) => set.join(', ')));
  });
});

it('has a valve lowest where the clock has it fully open', () => {
  // A margin of 60° leaves stops whose companions are near full lift; at the mate's full lift by definition:
  // No. 4's exhaust valve is full at 360 + (130 + 370)/2 = 610° of crank, when valve 1 may be set.
  const request = { firingOrder: [1, 3, 4, 2], valveTiming, valves: valvesOf(4, 'EI') };
  const plan = { mates: [], stops: [{ crank: 610, set: ['1'] }] };
  const drawing = drawLashPlan({ request, plan });
  expect(drawing.table.rows).toEqual([['1', '610°', '1', '7']]);
  expect(partsOf(drawing, 'valve:full')).toHaveLength(1);
});

it('numbers the valves from the front where their names are long, and says inlet in the person’s words', () => {
  const valves = valvesOf(4, 'EI').map((valve) => ({ ...valve, valve: `valve ${valve.valve}` }));
  const request = { firingOrder: [1, 3, 4, 2], valveTiming, valves };
  const drawing = drawLashPlan({ request, plan: lashOrder(request) }, { dialect: 'american' });
  expect(unreadable(drawing)).toEqual([]);
  expect(wordsOf(drawing)).toContain('8');
  expect(wordsOf(drawing).join(' ')).toContain('I intake');
  expect(drawing.title).toBe('Order of setting the lash');
});
