import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ValveTimingStep } from '@second-spanner/shared/contracts/steps';
import { TradeWords } from '../../../words/trade-words';
import {
  withNewPosition,
  withNewRow,
  withoutRow,
  withRow,
  type SightingDraft,
  type SightingsDraft,
} from './sightings';

/** What is seen of the valves, crank position by crank position. */
@Component({
  selector: 'ss-sighting-fields',
  imports: [MatButton, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sighting-fields.html',
  styleUrl: './sighting-fields.scss',
})
export class SightingFields {
  readonly definition = input.required<ValveTimingStep>();
  readonly typed = model.required<SightingsDraft>();

  protected readonly states = [
    { value: 'shut', words: 'shut' },
    { value: 'opening', words: 'opening' },
    { value: 'full', words: 'fully open' },
    { value: 'closing', words: 'closing' },
  ];
  protected readonly cylinders = computed(() =>
    [...this.definition().firingOrder].sort((a, b) =>
      String(a).localeCompare(String(b), 'en', { numeric: true }),
    ),
  );

  protected change(position: number, row: number, change: Partial<SightingDraft>): void {
    this.typed.update((typed) => withRow(typed, position, row, change));
  }

  protected withRow(position: number): SightingsDraft {
    return withNewRow(this.typed(), position, this.cylinders());
  }

  protected without(position: number, row: number): SightingsDraft {
    return withoutRow(this.typed(), position, row);
  }

  protected withPosition(): SightingsDraft {
    return withNewPosition(this.typed(), this.definition().cylinder);
  }

  protected ask(about: string): void {
    this.typed.update((typed) => ({ ...typed, about: Number(about) }));
  }
}
