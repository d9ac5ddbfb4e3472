import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { SpecEdition } from '@second-spanner/shared/contracts/spec';
import { tradeWord } from '@second-spanner/shared/contracts/trade-words';
import type { SpecRow } from '@second-spanner/shared/spec/spec-rows';
import { drawValveClock } from '@second-spanner/shared/drawing/valve-clock';
import { valveClock } from '@second-spanner/shared/valve-train/valve-clock';
import { DrawingFigure } from '../../drawing/drawing';
import { SessionStore } from '../../session/session-store';
import { VerdictLine } from '../../verdict/verdict';

/** Beside the values: the valve clock, what the edition rests on, and how many values have no source. */
@Component({
  selector: 'ss-edition-aside',
  imports: [DrawingFigure, VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-drawing caption="Valve clock, two turns of the crank in one ring" [of]="clock()" [widest]="340" />
    <p>
      Each circled number stands at that cylinder’s compression TDC. The hand stands where No.
      <span class="f">{{ spec().document.engine.firingOrder.value[0] }}</span> {{ inlet() }} begins to open.
    </p>
    <h2>Rests on</h2>
    <p>{{ spec().restsOn }}</p>
    <h2>Sources</h2>
    @if (withoutSource() === 0) {
      <ss-verdict of="pass" sentence="Every value has its source." />
    } @else {
      <ss-verdict of="doubtful" [sentence]="missing()" />
    }
    <p class="hash caption">
      Content hash <span class="f">{{ spec().hash }}</span>
    </p>
  `,
  styles: `
    :host {
      display: block;
    }

    h2 {
      margin: var(--ss-4) 0 6px;
      padding-bottom: 6px;
      font: var(--ss-t-strong);
      border-bottom: var(--ss-hair) solid var(--ss-rule);
    }

    p {
      font: var(--ss-t-small);
      color: var(--ss-ink-2);
    }

    .hash {
      margin-top: var(--ss-5);
      overflow-wrap: anywhere;
    }
  `,
})
export class EditionAside {
  readonly spec = input.required<SpecEdition>();
  readonly rows = input.required<readonly SpecRow[]>();

  private readonly dialect = inject(SessionStore).dialect;

  protected readonly inlet = computed(() => tradeWord('inlet', this.dialect()));
  protected readonly clock = computed(() => {
    const { engine, valveTrain } = this.spec().document;
    const valveTiming = valveTrain.timing.value;
    const request = { firingOrder: engine.firingOrder.value, valveTiming, crank: 360 - valveTiming.ivo };
    return drawValveClock({ request, clock: valveClock(request) }, { dialect: this.dialect() });
  });
  protected readonly withoutSource = computed(
    () => this.rows().filter(({ source }) => source === undefined).length,
  );
  protected readonly missing = computed(() => {
    const count = this.withoutSource();
    return count === 1 ? '1 value has no source.' : `${count} values have no source.`;
  });
}
