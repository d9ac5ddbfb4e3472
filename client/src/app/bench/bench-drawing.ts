import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { DrawingFigure } from '../drawing/drawing';
import { SessionStore } from '../session/session-store';
import { stepDrawing } from './step-drawing';

/** The drawing of an item's step, small; nothing while it can't be read. */
@Component({
  selector: 'ss-bench-drawing',
  imports: [DrawingFigure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (drawing(); as drawing) {
      <ss-drawing [of]="drawing" [bare]="true" [widest]="widest()" />
    }
  `,
})
export class BenchDrawing {
  private readonly dialect = inject(SessionStore).dialect;

  readonly sheetId = input.required<string>();
  readonly stepCode = input.required<string>();

  private readonly step = httpResource<StepDetail>(
    () => `/api/sheets/${this.sheetId()}/steps/${this.stepCode()}`,
  );
  protected readonly drawing = computed(() =>
    this.step.hasValue() ? stepDrawing(this.step.value(), this.dialect()) : null,
  );
  /** Tall drawings are kept to the row's height. */
  protected readonly widest = computed(() => {
    const drawing = this.drawing();
    return drawing === null ? null : Math.min(286, (210 * drawing.width) / drawing.height);
  });
}
