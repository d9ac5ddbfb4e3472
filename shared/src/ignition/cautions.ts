import type { Cylinder, ValveTiming } from '../contracts/calculations.js';
import { isOpen, valveEvents } from '../valve-train/phase.js';
import { sparkPosition } from './spark-position.js';
import { misplaced, type Wiring } from './wiring.js';
import { cylindersNamed } from './words.js';

/** A spark earlier than this against its own time is well before TDC, crank degrees. */
const wellEarly = 20;

/** What an inlet valve usually does, where its timing is not known (common practice, no source). */
const usualTiming: ValveTiming = { ivo: 15, ivc: 50, evo: 50, evc: 15 };

/**
 * What can come of cranking an engine wired like this, as sentences that name the cylinders: sparks on an
 * open inlet valve and sparks well before TDC. Empty for a wiring that is right.
 *
 * @param advance crank degrees before TDC
 * @param timing where it is not known, a usual inlet valve is taken, and the sentence says so
 */
export function cautionsFor(wiring: Wiring, advance: number, timing?: ValveTiming): readonly string[] {
  const wrong = misplaced(wiring);
  if (wrong.length === 0) return [];
  const { inlet } = valveEvents(timing ?? usualTiming);
  const sparks = wrong.map((lead) => ({ ...lead, ...sparkPosition(lead.late, advance) }));
  const onInlet = sparks.filter(({ phase }) => isOpen(inlet, phase));
  const early = sparks.filter(({ stroke, late }) => stroke === 'compression' && late <= -wellEarly);
  return [
    ...onOpenInlet(
      onInlet.map(({ cylinder }) => cylinder),
      timing !== undefined,
    ),
    ...wellBeforeTdc(early.map(({ cylinder }) => cylinder)),
    'Do not crank the engine until the leads are moved.',
  ];
}

function onOpenInlet(cylinders: readonly Cylinder[], known: boolean): readonly string[] {
  if (cylinders.length === 0) return [];
  const open = known ? 'the inlet valve open' : 'the inlet valve probably open';
  return [
    `${sparksOf(cylinders)} with ${open}: ` +
      'it can flash back through the carburettor. Keep face, hands and fuel away from it.',
  ];
}

function wellBeforeTdc(cylinders: readonly Cylinder[]): readonly string[] {
  if (cylinders.length === 0) return [];
  return [
    `${sparksOf(cylinders)} on the compression stroke, well before TDC: ` +
      'the engine can kick back and throw the crank backwards. Keep hands off a starting handle.',
  ];
}

function sparksOf(cylinders: readonly Cylinder[]): string {
  const [spark, comes] = cylinders.length === 1 ? ['spark', 'comes'] : ['sparks', 'come'];
  return `The ${spark} of ${cylindersNamed(cylinders)} ${comes}`;
}
