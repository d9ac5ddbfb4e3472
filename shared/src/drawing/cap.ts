import { leadsHere, rotationOnCap, type CapDrawingInput, type LeadHere } from './cap-input.js';
import { layOutCap, type CapLayout } from './cap-layout.js';
import { capBody, capRim, conductors, lead, posts, rotor } from './cap-parts.js';
import { swapMarks } from './cap-swaps.js';
import { capInWords, capTable } from './cap-words.js';
import { text, type Drawing, type Shape } from './shapes.js';
import { wording, type DrawingOptions } from './words.js';

export type { CapDrawingInput } from './cap-input.js';
export type { CapSides } from './cap-layout.js';

/**
 * The distributor cap from above, where the leads plug in: posts by angle (degrees clockwise from the mark),
 * outlets by name, cylinders by a circled number. Wrong leads are solid and show where they go. While what
 * is fitted is being entered (`showRequired` false) there is no rotor, no trace and no required cylinder.
 */
export function drawCap(input: CapDrawingInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const swaps = input.showRequired ? (input.diagnosis?.swaps ?? []) : [];
  const layout = layOutCap(input.map, swaps.length > 0, input.sides);
  const leads = leadsHere(layout.leads, input);
  const shapes: readonly Shape[] = [
    ...capBody(layout),
    ...leads.flatMap((placed) => lead(layout, placed)),
    ...capRim(layout),
    ...(input.showRequired ? requiredInside(layout, input) : layout.sideOutlets ? [] : posts(layout)),
    ...swapMarks(layout, swaps, leads),
    ...(input.showRequired ? bothRight(layout, leads) : []),
  ];
  return {
    title: 'Distributor cap from above',
    description: capInWords(input, leads, layout.sideOutlets, words),
    width: layout.width,
    height: layout.height,
    shapes,
    table: capTable(input, leads, words),
  };
}

function requiredInside(layout: CapLayout, { request, rotorAngle }: CapDrawingInput): readonly Shape[] {
  return [
    ...(layout.sideOutlets ? conductors(layout) : []),
    ...rotor(layout, rotationOnCap(request), rotorAngle),
    ...posts(layout),
  ];
}

/** Says so where one side of a four's cap is right and the other is not. */
function bothRight({ centre, width }: CapLayout, leads: readonly LeadHere[]): readonly Shape[] {
  const sides = (['left', 'right'] as const).map((way) => leads.filter((placed) => placed.way === way));
  const wrong = sides.map((side) => side.some(({ state }) => state.wrong));
  return sides.flatMap((side, i) => {
    const fitted = side.every(({ state }) => state.cylinder !== undefined);
    if (side.length !== 2 || !fitted || wrong[i] === true || wrong[1 - i] !== true) {
      return [];
    }
    const [x, anchor] = i === 0 ? ([4, 'start'] as const) : ([width - 4, 'end'] as const);
    return [text(x, centre.y + 4, 'both right', { ink: 'ink-2', halo: true, anchor })];
  });
}
