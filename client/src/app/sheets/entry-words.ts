import type { EntryContent, StepDefinition } from '@second-spanner/shared/contracts/steps';
import { printQuantity } from '@second-spanner/shared/quantities/print';
import { lastPass } from '@second-spanner/shared/sheet/plan-of';

type Pull = Extract<EntryContent, { kind: 'tightening' }>;

export const withCapital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** What was recorded, in few words: `Nut 5, 54.9 N·m`. May hold trade-word tokens. */
export function entryWords(definition: StepDefinition, content: EntryContent): string {
  switch (content.kind) {
    case 'check': {
      const outcome = content.outcome === 'pass' ? 'Right' : 'Wrong';
      return content.note === undefined ? outcome : `${outcome}: ${content.note}`;
    }
    case 'measurement':
      return `${content.at}, ${printQuantity(content.value)}`;
    case 'tightening':
      return pullWords(definition, content);
    case 'wiring':
      return `{Leads} by {outlet}: ${Object.entries(content.fitted)
        .map(([outlet, cylinder]) => `${outlet} ${cylinder}`)
        .join(', ')}`;
    case 'valve-timing':
      return content.sightings.length === 1
        ? 'Valves seen at one crank position'
        : `Valves seen at ${content.sightings.length} crank positions`;
    case 'photo':
      return `Photo: ${content.shows}`;
  }
}

function pullWords(definition: StepDefinition, pull: Pull): string {
  if (definition.kind !== 'tightening') return `Fastener ${pull.fastener}, ${pullFigure(pull)}`;
  const name = `${definition.group.noun} ${pull.fastener}, ${pullFigure(pull)}`;
  return lastPass(definition) > 1 ? `Pass ${pull.pass}, ${name}` : withCapital(name);
}

/** What the wrench showed or was set to, or how far a fastener was turned on. */
export function pullFigure({ setting, reading, angle }: Pull): string {
  if (angle !== undefined) return `turned ${angle}°`;
  if (reading !== undefined) return printQuantity(reading);
  return setting === undefined ? 'no figure' : `set to ${printQuantity(setting)}`;
}
