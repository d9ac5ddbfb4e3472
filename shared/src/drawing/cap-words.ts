import { degrees, rotationOnCap, type CapDrawingInput, type LeadHere } from './cap-input.js';
import { traced } from './cap-layout.js';
import type { DrawingTable } from './shapes.js';
import { inWords, type Wording } from './words.js';

/** The cap in a table: a row a post, in the order in which the rotor meets them. */
export function capTable(
  { showRequired, fitted }: CapDrawingInput,
  leads: readonly LeadHere[],
  { say }: Wording,
): DrawingTable {
  const withOutlets = traced(leads.map(({ row }) => row));
  if (!showRequired) {
    return {
      columns: [withOutlets ? say('{Outlet}') : 'Post', 'Fitted'],
      rows: byName(leads).map(({ name, state }) => [name, String(state.cylinder ?? 'not yet')]),
    };
  }
  return {
    columns: [
      'Post',
      ...(withOutlets ? [say('{Outlet}')] : []),
      ...(fitted === undefined ? ['Cylinder'] : ['Should be', 'Fitted', 'Put right']),
    ],
    rows: leads.map((lead) => [
      `${degrees(lead.row.angle)}°`,
      ...(withOutlets ? [lead.row.outlet] : []),
      String(lead.row.cylinder),
      ...(fitted === undefined ? [] : [String(lead.state.cylinder ?? 'not yet'), cureOf(lead)]),
    ]),
  };
}

/** Rotor order would give away what is asked for, so that while entering the rows go by name. */
function byName(leads: readonly LeadHere[]): readonly LeadHere[] {
  return [...leads].sort((a, b) => a.name.localeCompare(b.name, 'en', { numeric: true }));
}

function cureOf({ state, moveTo }: LeadHere): string {
  if (state.wrong) {
    return moveTo === undefined ? 'wrong' : `to ${moveTo}`;
  }
  return state.cylinder === undefined ? '' : 'right';
}

/** The cap in sentences. */
export function capInWords(
  input: CapDrawingInput,
  leads: readonly LeadHere[],
  sideOutlets: boolean,
  { say }: Wording,
): string {
  const sentences = input.showRequired ? required(input, leads, sideOutlets) : entering(leads);
  return say(sentences.filter((sentence) => sentence !== '').join(' '));
}

function entering(leads: readonly LeadHere[]): readonly string[] {
  const entered = byName(leads).filter(({ state }) => state.cylinder !== undefined);
  const items = entered.map(({ state, name }) => `cylinder ${state.cylinder} in ${name}`);
  return [
    `${leads.length} {leads}.`,
    items.length === 0 ? 'None entered yet.' : `Entered so far: ${inWords(items)}.`,
  ];
}

function required(
  input: CapDrawingInput,
  leads: readonly LeadHere[],
  sideOutlets: boolean,
): readonly string[] {
  const rotation = rotationOnCap(input.request) === 'clockwise' ? 'clockwise' : '{anticlockwise}';
  const angles = leads.map(({ row }) => row.angle).sort((a, b) => a - b);
  const first = leads[0]?.row;
  const there = leads.filter(({ state }) => state.cylinder !== undefined);
  const wrong = leads.filter(({ state }) => state.wrong);
  return [
    `${leads.length} posts at ${inWords(angles.map(degrees))} degrees clockwise from the mark.`,
    first === undefined
      ? ''
      : input.rotorAngle === undefined
        ? `The rotor turns ${rotation} and points at the ${degrees(first.angle)} degree post, ` +
          `cylinder ${first.cylinder}.`
        : `The rotor turns ${rotation} and was seen to point at ${degrees(input.rotorAngle)} degrees.`,
    ...(sideOutlets
      ? leads.map(({ row }) => `{Outlet} ${row.outlet} is joined to the ${degrees(row.angle)} degree post.`)
      : []),
    there.length === 0
      ? ''
      : `{Leads}: ${inWords(there.map(({ state, name }) => `${state.cylinder} in ${name}`))}.`,
    wrong.length === 0 ? '' : `Wrong: ${inWords(wrong.map(({ state }) => `{lead} ${state.cylinder}`))}.`,
    ...(input.diagnosis?.swaps ?? []).map(({ outlets }) => {
      const names = outlets.map((outlet) => leads.find(({ row }) => row.outlet === outlet)?.name ?? outlet);
      return `Swap the {leads} of ${inWords(names)}.`;
    }),
  ];
}
