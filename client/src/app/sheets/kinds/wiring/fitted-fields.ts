import { ChangeDetectionStrategy, Component, computed, inject, input, model, signal } from '@angular/core';
import { capMap } from '@second-spanner/shared/ignition/cap-map';
import type { WiringStep } from '@second-spanner/shared/contracts/steps';
import { drawCap } from '@second-spanner/shared/drawing/cap';
import { DrawingFigure } from '../../../drawing/drawing';
import { SessionStore } from '../../../session/session-store';
import { Sign } from '../../../verdict/sign';
import { TradeWords } from '../../../words/trade-words';
import { cylindersByOutlet, cylindersOf, outletsOf, type FittedDraft } from './fitted';

/** Asks outlet by outlet which cylinder's lead is fitted there. Nothing shows what ought to be. */
@Component({
  selector: 'ss-fitted-fields',
  imports: [DrawingFigure, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-drawing [of]="drawing()" [bare]="true" [widest]="480" />
    <div class="outlets">
      @for (outlet of outlets(); track outlet) {
        <label [class.twice]="isTwice(outlet)">
          <span
            >{{ '{Outlet}' | tradeWords }} <span class="f">{{ outlet }}</span></span
          >
          <select
            #choice
            (focus)="inHand.set(outlet)"
            (change)="choose(outlet, choice.value)"
            [attr.aria-invalid]="isTwice(outlet)"
          >
            <option value="" [selected]="!fitted()[outlet]">goes to…</option>
            @for (cylinder of cylinders(); track cylinder) {
              <option [value]="cylinder" [selected]="fitted()[outlet] === '' + cylinder">
                cylinder {{ cylinder }}
              </option>
            }
          </select>
        </label>
      }
    </div>
    @if (sentence(); as words) {
      <p class="small error" role="alert"><ss-sign name="fail" />{{ words | tradeWords }}</p>
    }
  `,
  styleUrl: './fitted-fields.scss',
})
export class FittedFields {
  private readonly sessions = inject(SessionStore);

  readonly definition = input.required<WiringStep>();
  readonly fitted = model.required<FittedDraft>();
  readonly error = input<string | null>(null);

  protected readonly inHand = signal<string | null>(null);
  protected readonly outlets = computed(() => outletsOf(this.definition()));
  protected readonly cylinders = computed(() => cylindersOf(this.definition()));
  protected readonly drawing = computed(() => {
    const { cap } = this.definition();
    return drawCap(
      {
        map: capMap(cap),
        request: cap,
        fitted: cylindersByOutlet(this.definition(), this.fitted()),
        fittedBy: 'outlet',
        showRequired: false,
        inHand: this.inHand() ?? undefined,
      },
      { dialect: this.sessions.dialect() },
    );
  });
  private readonly twice = computed(() => {
    const chosen = Object.values(this.fitted()).filter((cylinder) => cylinder !== '');
    return new Set(chosen.filter((cylinder, i) => chosen.indexOf(cylinder) !== i));
  });
  protected readonly sentence = computed(() => {
    const [cylinder] = this.twice();
    return cylinder === undefined
      ? this.error()
      : `Cylinder ${cylinder} is chosen at two {outlets}: look again.`;
  });

  protected isTwice(outlet: string): boolean {
    return this.twice().has(this.fitted()[outlet] ?? '');
  }

  protected choose(outlet: string, cylinder: string): void {
    this.fitted.update((fitted) => ({ ...fitted, [outlet]: cylinder }));
  }
}
