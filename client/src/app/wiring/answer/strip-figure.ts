import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { drawSparkStrip } from '@second-spanner/shared/drawing/spark-strip';
import type { WiringAnswer } from '@second-spanner/shared/workings/wiring-map/work-out';
import { DrawingFigure } from '../../drawing/drawing';
import { SessionStore } from '../../session/session-store';

/** Where each spark falls in its own cylinder's cycle, with the leads as fitted. */
@Component({
  selector: 'ss-strip-figure',
  imports: [DrawingFigure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (drawing(); as drawing) {
      <ss-drawing
        caption="Where each spark falls, in its own cylinder’s cycle"
        [of]="drawing"
        [widest]="560"
      />
    }
  `,
})
export class StripFigure {
  private readonly dialect = inject(SessionStore).dialect;

  readonly answer = input.required<WiringAnswer>();

  protected readonly drawing = computed(() => {
    const { diagnosis, valveTiming, advance } = this.answer();
    return diagnosis === null
      ? null
      : drawSparkStrip({ request: { valveTiming, advance }, diagnosis }, { dialect: this.dialect() });
  });
}
