import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';

/** In the place of figures that are kept from a person until their own reading is in. */
@Component({
  selector: 'ss-covered-plate',
  imports: [Sentence, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div>
      <p class="heading"><ss-sign name="waiting" />First reading covered</p>
      <p><ss-sentence [text]="sentence()" /></p>
    </div>
  `,
  styles: `
    :host {
      display: block;
      padding: 9px;
      border: var(--ss-frame) dashed var(--ss-thin);
      background: repeating-linear-gradient(135deg, transparent 0 6px, var(--ss-thin) 6px 7px);
    }

    div {
      padding: var(--ss-1) var(--ss-3);
      background: var(--ss-paper);
    }

    .heading {
      display: flex;
      gap: var(--ss-2);
      font: var(--ss-t-strong);
      color: var(--ss-wait);
    }
  `,
})
export class CoveredPlate {
  readonly sentence = input('You see it when yours is kept. Yours can’t be changed after that.');
}
