import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

const divisions = 14;

/** A ruled bar of fourteen fields: done solid, the one in hand hatched, the rest plain. */
@Component({
  selector: 'ss-progress-rule',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    role: 'progressbar',
    'aria-valuemin': '0',
    '[attr.aria-valuenow]': 'done()',
    '[attr.aria-valuemax]': 'of()',
    '[attr.aria-valuetext]': 'done() + " of " + of()',
    '[attr.aria-label]': 'label()',
  },
  template: '@for (field of fields(); track $index) {<span [class]="field"></span>}',
  styleUrl: './progress-rule.scss',
})
export class ProgressRule {
  readonly done = input.required<number>();
  readonly of = input.required<number>();
  readonly label = input('Steps done');

  protected readonly fields = computed(() => {
    const share = this.of() === 0 ? 0 : this.done() / this.of();
    const whole = share >= 1 ? divisions : Math.min(divisions - 1, Math.floor(share * divisions));
    return Array.from({ length: divisions }, (_, index) => {
      if (index < whole) return 'done';
      return index === whole && share > 0 ? 'in-hand' : 'to-come';
    });
  });
}
