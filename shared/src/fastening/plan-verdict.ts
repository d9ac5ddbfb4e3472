import type { TighteningPass } from '../contracts/calculations.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { toSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { standsAtEdge } from './edge.js';
import type { Finals } from './finals.js';
import type { Layout } from './layout.js';

export interface PlanParts {
  readonly layout: Layout;
  readonly sequence: readonly string[];
  readonly isGiven: boolean;
  readonly passes: readonly TighteningPass[];
  readonly finals: Finals;
}

/**
 * Whether a plan can be worked as it stands: doubtful where a given sequence begins at an edge, where a pass is
 * lower than the one before, or where no pass reaches the final torque. The reason says whose order it is.
 */
export function judgePlan(parts: PlanParts): Judgement {
  const doubts = [edgeDoubt(parts), fallingDoubt(parts), shortDoubt(parts)].filter(
    (doubt) => doubt !== undefined,
  );
  const verdict = doubts.length > 0 ? 'doubtful' : 'pass';
  return { verdict, reason: [...doubts, whoseOrder(parts), whatItIs(parts)].join(' ') };
}

function edgeDoubt({ layout, sequence, isGiven }: PlanParts): string | undefined {
  const [first] = sequence;
  if (!isGiven || first === undefined || !standsAtEdge(layout, first)) return undefined;
  return (
    `The sequence begins at an edge, with fastener ${first}: a joint is pulled down from its centre outwards. ` +
    `Read the maker's sequence again; a loosening order begins at the edges.`
  );
}

function fallingDoubt({ passes, finals }: PlanParts): string | undefined {
  const final = smallest(finals);
  let highest = 0;
  for (const [i, pass] of passes.entries()) {
    const torque = torqueIn(pass, final);
    if (torque === undefined) continue;
    if (torque < highest * (1 - 1e-9))
      return `Pass ${i + 1} is lower than one before it and would do nothing.`;
    highest = Math.max(highest, torque);
  }
  return undefined;
}

function shortDoubt({ passes, finals }: PlanParts): string | undefined {
  const final = smallest(finals);
  if (final === undefined || passes.some((pass) => 'angle' in pass)) return undefined;
  const reaches = [...finals.values()].every((each) =>
    passes.some((pass) => (torqueIn(pass, toSi(each)) ?? 0) >= toSi(each) * (1 - 1e-9)),
  );
  return reaches ? undefined : 'No pass brings every fastener to its final torque.';
}

/** The torque of a pass in N·m for a fastener of this final torque; a pass by angle has none. */
function torqueIn(pass: TighteningPass, final = 0): number | undefined {
  if ('torque' in pass) return toSi(pass.torque);
  if ('fraction' in pass) return pass.fraction * final;
  return 'check' in pass ? final : undefined;
}

function smallest(finals: Finals): number | undefined {
  return finals.size === 0 ? undefined : Math.min(...[...finals.values()].map(toSi));
}

function whoseOrder({ isGiven, layout }: PlanParts): string {
  if (isGiven) return "The sequence was given and is taken for the maker's.";
  const how = layout.pattern === 'circle' ? 'opposite and crossing' : 'centre outwards';
  return `General practice, ${how}, not the maker's sequence: where the maker gives one, it goes before this.`;
}

function whatItIs({ sequence, passes, finals }: PlanParts): string {
  const count = (number: number, one: string, many: string): string =>
    `${number} ${number === 1 ? one : many}`;
  const torques = new Map(
    [...finals.values()].map((each): [string, Quantity] => [printQuantity(each), each]),
  );
  const to = [...torques.values()].sort((a, b) => toSi(a) - toSi(b)).map((each) => printQuantity(each));
  const range =
    to.length === 0 ? '' : ` to ${to.length === 1 ? to[0] : `${to[0]} up to ${to.at(-1)}, each its own`}`;
  return `${count(sequence.length, 'fastener', 'fasteners')} in ${count(passes.length, 'pass', 'passes')}${range}.`;
}
