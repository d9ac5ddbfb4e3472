import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { CapDiagnosis, CapMap, Cylinder } from '@second-spanner/shared/contracts/calculations';
import type { Place } from '@second-spanner/shared/workings/wiring-map/work-out';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { TradeWords } from '../../words/trade-words';

/** The leads as fitted, by outlet: begins empty, and nothing is filled in. Wrong ones are marked once judged. */
@Component({
  selector: 'ss-fitted-cells',
  imports: [Sentence, Sign, TradeWords],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <fieldset>
      <legend>{{ '{Leads} as fitted' | tradeWords }}</legend>
      <p class="small quiet">
        {{ 'Which cylinder’s {lead} is in each {outlet}? Follow it by hand.' | tradeWords }}
      </p>
      <div class="cells">
        @for (cell of cells(); track cell.key) {
          <label [class.wrong]="cell.wrong">
            <span class="f"
              ><span class="visually-hidden">{{ '{Outlet} ' | tradeWords }}</span
              >{{ cell.name }}</span
            >
            <select
              #cylinder
              class="f"
              [attr.aria-invalid]="cell.twice"
              (change)="fit(cell.key, cylinder.value)"
            >
              <option value="" [selected]="!fitted()[cell.key]">–</option>
              @for (choice of cylinders(); track choice) {
                <option [value]="choice" [selected]="fitted()[cell.key] === '' + choice">{{ choice }}</option>
              }
            </select>
          </label>
        }
      </div>
      <p class="error" aria-live="polite">
        @if (sentence(); as words) {
          <ss-sign name="fail" /><ss-sentence [text]="words" />
        }
      </p>
    </fieldset>
  `,
  styleUrl: './cells.scss',
})
export class FittedCells {
  readonly places = input.required<readonly Place[]>();
  readonly order = input.required<readonly Cylinder[]>();
  readonly fitted = input.required<Readonly<Record<string, string>>>();
  readonly traced = input.required<boolean>();
  readonly map = input.required<CapMap>();
  readonly diagnosis = input.required<CapDiagnosis | null>();
  readonly error = input<string | undefined>();
  readonly changed = output<Readonly<Record<string, string>>>();

  protected readonly cylinders = computed(() =>
    [...this.order()].sort((a, b) => String(a).localeCompare(String(b), 'en', { numeric: true })),
  );
  protected readonly cells = computed(() => {
    const fitted = this.fitted();
    const chosen = this.places().map(({ key }) => fitted[key] ?? '');
    return this.places().map(({ outlet, key }) => {
      const mine = fitted[key] ?? '';
      const own = this.map().rows.find((row) => row.outlet === outlet)?.cylinder;
      return {
        key,
        name: this.traced() ? key : `${key}°`,
        wrong: this.diagnosis() !== null && mine !== String(own),
        twice: mine !== '' && chosen.filter((one) => one === mine).length > 1,
      };
    });
  });
  protected readonly sentence = computed(() => {
    const twice = this.cells().find((cell) => cell.twice);
    return twice === undefined
      ? this.error()
      : `Cylinder ${this.fitted()[twice.key] ?? ''} is at two {outlets}: look again.`;
  });

  protected fit(key: string, cylinder: string): void {
    this.changed.emit({ ...this.fitted(), [key]: cylinder });
  }
}
