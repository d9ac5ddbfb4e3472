import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Sentence } from '../quantity/sentence';
import { Sign } from '../verdict/sign';

/** The plate with the hatched edge: a hold point ahead, or standing. Its act is projected, as a text button. */
@Component({
  selector: 'ss-hold-plate',
  imports: [Sentence, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="words">
      <p class="heading"><ss-sign name="hold" />{{ heading() }}</p>
      <p class="sentence"><ss-sentence [text]="sentence()" /></p>
    </div>
    <ng-content />
  `,
  styleUrl: './hold-plate.scss',
})
export class HoldPlate {
  readonly heading = input('Hold point ahead');
  readonly sentence = input.required<string>();
}
