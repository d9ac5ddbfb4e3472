import type { EntryView } from '@second-spanner/shared/contracts/sheets';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { SecondReadingContent, StepDefinition } from '@second-spanner/shared/contracts/steps';
import type { Drawing } from '@second-spanner/shared/drawing/shapes';
import type { DrawingOptions } from '@second-spanner/shared/drawing/words';
import { bandIn } from '../kinds/measurement/band';
import { chosenUnit } from '../units/chosen-unit';

export interface PlaceBand {
  readonly place: string;
  readonly drawing: Drawing;
}

/** Where both people measured: their two readings of each place on its tolerance band. */
export function bandsOf(
  definition: StepDefinition,
  first: readonly Pick<EntryView, 'content'>[],
  second: SecondReadingContent,
  tools: readonly Tool[],
  options: DrawingOptions,
): readonly PlaceBand[] {
  if (definition.kind !== 'measurement') return [];
  if (second.kind !== 'measured-again' && second.kind !== 'strip-read-again') return [];
  const toolOf = (id: string): Tool | undefined => tools.find((tool) => tool.id === id);
  const unit = chosenUnit(definition.unit);
  return second.readings.flatMap(({ at, value }): PlaceBand[] => {
    const content = first
      .map((entry) => entry.content)
      .find((each) => each.kind === 'measurement' && each.at === at);
    if (content?.kind !== 'measurement') return [];
    const drawing = bandIn(
      definition.limits,
      unit,
      [
        { value: content.value, tool: toolOf(content.toolId), role: 'first', label: 'first' },
        { value, tool: toolOf(second.toolId), role: 'second', label: 'second' },
      ],
      options,
    );
    return drawing === null ? [] : [{ place: at, drawing }];
  });
}
