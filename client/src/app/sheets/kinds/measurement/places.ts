import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { QuantityText } from '../../../quantity/quantity';
import { VerdictLine } from '../../../verdict/verdict';
import type { FilledSlot } from '../../next-slot';
import { StepWork } from '../../step-work';

/** All places of a measurement with what was read there; another one is taken up by its button. */
@Component({
  selector: 'ss-places',
  imports: [QuantityText, VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (places().length > 1 || places()[0]?.value) {
      <table class="ruled">
        <caption class="visually-hidden">
          Readings by place
        </caption>
        <thead>
          <tr>
            <th scope="col">Place</th>
            <th scope="col" class="right">Read</th>
            <th scope="col">Found</th>
          </tr>
        </thead>
        <tbody>
          @for (place of places(); track place.key) {
            <tr [class.here]="place.key === atHand()">
              <th scope="row">
                @if (work.isOpen() && place.key !== atHand()) {
                  <button type="button" (click)="work.choose(place.key)">{{ place.label }}</button>
                } @else {
                  {{ place.label }}
                }
              </th>
              <td class="right">
                @if (place.value; as value) {
                  <ss-quantity [of]="value" />
                }
              </td>
              <td>
                @if (place.verdict; as verdict) {
                  <ss-verdict [of]="verdict" />
                } @else {
                  <span class="quiet">{{ place.key === atHand() ? 'at hand' : 'to come' }}</span>
                }
              </td>
            </tr>
          }
        </tbody>
      </table>
    }
  `,
  styles: `
    .here th {
      font-weight: 600;
      color: var(--ss-oxide);
    }

    td,
    tbody th {
      vertical-align: middle;
    }

    button {
      min-height: 48px;
      margin: -10px 0;
      padding: 0;
      text-align: left;
      color: var(--ss-blue);
      background: none;
      border: 0;
      cursor: pointer;
    }

    @media (min-width: 960px) {
      button {
        min-height: 36px;
      }
    }
  `,
})
export class Places {
  protected readonly work = inject(StepWork);

  readonly slots = input.required<readonly FilledSlot[]>();
  readonly atHand = input.required<string | null>();

  protected readonly places = computed(() =>
    this.slots().map(({ key, label, entry }) => ({
      key,
      label,
      value: entry?.content.kind === 'measurement' ? entry.content.value : null,
      verdict: entry?.verdict ?? null,
    })),
  );
}
