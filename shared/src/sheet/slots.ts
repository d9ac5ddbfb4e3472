import type { EntryContent, StepDefinition } from '../contracts/steps.js';
import { planOf } from './plan-of.js';

/** One thing that a step wants recorded. Its key is stable: entries on the same slot replace each other. */
export interface Slot {
  readonly key: string;
  readonly label: string;
}

const pull = (pass: number, fastener: string) => `pull/${pass}/${fastener}`;

/** Everything that a step wants recorded, in the order it is worked. */
export function slotsOf(definition: StepDefinition): readonly Slot[] {
  switch (definition.kind) {
    case 'measurement':
      return definition.at.map((at) => ({ key: `at/${at}`, label: at }));
    case 'tightening':
      return planOf(definition).steps.map(({ pass, fastener }) => ({
        key: pull(pass, fastener),
        label: `Pass ${pass}, ${definition.group.noun} ${fastener}`,
      }));
    case 'photo':
      return definition.shows.map((shows) => ({ key: `photo/${shows}`, label: shows }));
    case 'check':
    case 'wiring':
    case 'valve-timing':
      return [{ key: definition.kind, label: definition.title }];
  }
}

/** The slot that an entry fills. */
export function slotKeyOf(content: EntryContent): string {
  switch (content.kind) {
    case 'measurement':
      return `at/${content.at}`;
    case 'tightening':
      return pull(content.pass, content.fastener);
    case 'photo':
      return `photo/${content.shows}`;
    case 'check':
    case 'wiring':
    case 'valve-timing':
      return content.kind;
  }
}
