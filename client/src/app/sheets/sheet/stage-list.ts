import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal } from '@angular/core';
import { RouterLink } from '@angular/router';
import { stepStatusWords } from '@second-spanner/shared/sheet/words';
import { Sign } from '../../verdict/sign';
import { TradeWords } from '../../words/trade-words';
import { SheetStore } from '../sheet-store';
import { stageOf, stageProgress, stepToOpen } from './stage-progress';

/** The sheet's stages with their progress and hold marks; the one at hand shows its steps, others on request. */
@Component({
  selector: 'ss-stage-list',
  imports: [RouterLink, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './stage-list.html',
  styleUrl: './stage-list.scss',
})
export class StageList {
  protected readonly store = inject(SheetStore);

  /** Whether each stage says how many of its steps are done. */
  readonly counts = input(false);

  protected readonly words = { done: 'done', 'in-hand': 'in hand', 'to-come': 'to come' } as const;
  protected readonly statusWords = stepStatusWords;
  protected readonly stages = computed(() =>
    this.store.stages().map((line) => ({
      line,
      progress: stageProgress(line),
      done: line.steps.filter(({ status }) => status === 'done').length,
    })),
  );

  private readonly atHand = computed(() => {
    const stages = this.store.stages();
    const next = this.store.sheet.hasValue() ? this.store.sheet.value().nextStep : null;
    return stageOf(this.store.code() ?? stepToOpen(next, stages), stages)?.stage ?? null;
  });
  /** Turned by hand, until another stage is at hand. */
  private readonly turned = linkedSignal<number | null, ReadonlySet<number>>({
    source: this.atHand,
    computation: (stage) => new Set(stage === null ? [] : [stage]),
  });

  protected isOpen(stage: number): boolean {
    return this.turned().has(stage);
  }

  protected turn(stage: number): void {
    this.turned.update((open) => {
      const turned = new Set(open);
      if (!turned.delete(stage)) turned.add(stage);
      return turned;
    });
  }
}
