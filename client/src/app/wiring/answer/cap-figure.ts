import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { drawCap } from '@second-spanner/shared/drawing/cap';
import type { WiringAnswer } from '@second-spanner/shared/workings/wiring-map/work-out';
import { DrawingFigure } from '../../drawing/drawing';
import { SessionStore } from '../../session/session-store';

/** The cap from above with its map, and over it what is fitted and wrong. */
@Component({
  selector: 'ss-cap-figure',
  imports: [DrawingFigure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (drawing(); as drawing) {
      <ss-drawing [of]="drawing" [caption]="caption()" [widest]="520" />
    }
  `,
})
export class CapFigure {
  private readonly dialect = inject(SessionStore).dialect;

  readonly answer = input.required<WiringAnswer>();
  /** Whether the tracks inside the cap are drawn too. */
  readonly traced = input.required<boolean>();

  protected readonly drawing = computed(() => {
    const { map, cap, fitted, diagnosis } = this.answer();
    if (map === null || cap === null) return null;
    const asFitted = fitted === null ? {} : { fitted, fittedBy: 'outlet' as const };
    return drawCap(
      { map, request: cap, ...asFitted, diagnosis: diagnosis ?? undefined, showRequired: true },
      { dialect: this.dialect() },
    );
  });
  protected readonly caption = computed(() =>
    tradeText(
      this.traced()
        ? 'Cap from above, where the {leads} plug in. Angles clockwise from the mark. Dashed: inside the cap.'
        : 'Cap from above, where the {leads} plug in. Angles clockwise from the mark.',
      this.dialect(),
    ),
  );
}
