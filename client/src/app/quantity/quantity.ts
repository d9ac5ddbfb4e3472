import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import { printQuantity } from '@second-spanner/shared/quantities/print';

/** A number and its unit, lighter, after a thin space; never parted. */
@Component({
  selector: 'ss-quantity',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'n' },
  template: '<span class="f">{{ number() }}</span><span class="u">&thinsp;{{ of().unit }}</span>',
})
export class QuantityText {
  readonly of = input.required<Quantity>();
  /** Decimals to print; without it no idle zeros. */
  readonly digits = input<number>();

  protected readonly number = computed(() => {
    const printed = printQuantity(this.of(), { digits: this.digits() });
    return printed.slice(0, printed.length - this.of().unit.length).trim();
  });
}
