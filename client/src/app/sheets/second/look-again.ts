import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ValveTimingStep } from '@second-spanner/shared/contracts/steps';
import { Foot } from '../../foot/foot';
import { Sign } from '../../verdict/sign';
import { draft } from '../drafts/draft';
import { SightingFields } from '../kinds/valve-timing/sighting-fields';
import {
  emptySightings,
  isSightingsDraft,
  readSightings,
  type SightingsDraft,
} from '../kinds/valve-timing/sightings';
import { Told } from '../kinds/valve-timing/told';
import { SaveLine } from '../saving/save-line';
import { SecondWork } from './second-work';

const unopened: SightingsDraft = { positions: [], about: -1 };

/** The valves looked at again, blind; what one's own sightings tell is shown at once. */
@Component({
  selector: 'ss-look-again',
  imports: [Foot, MatButton, SaveLine, SightingFields, Sign, Told],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-sighting-fields [definition]="definition()" [typed]="typed()" (typedChange)="kept.set($event)" />
    <ss-told [definition]="definition()" [seen]="seen()" />
    @if (work.errorAt('content.sightings'); as sentence) {
      <p class="field-error" role="alert"><ss-sign name="fail" />{{ sentence }}</p>
    }
    <ss-foot>
      <ss-save-line [of]="work.saving.state()" />
      <button
        matButton="filled"
        type="button"
        [disabled]="seen() === null || work.saving.state().state === 'saving'"
        (click)="keep()"
      >
        Keep what I saw
      </button>
    </ss-foot>
  `,
  styleUrl: './part.scss',
})
export class LookAgain {
  protected readonly work = inject(SecondWork);

  readonly definition = input.required<ValveTimingStep>();

  protected readonly kept = draft(() => this.work.draftKey('sightings'), unopened, isSightingsDraft);
  protected readonly typed = computed(() =>
    this.kept().positions.length === 0 ? emptySightings(this.definition().cylinder) : this.kept(),
  );
  protected readonly seen = computed(() => readSightings(this.typed(), this.definition().firingOrder));

  protected async keep(): Promise<void> {
    const seen = this.seen();
    if (seen !== null && (await this.work.keepReading({ kind: 'read-again', ...seen })))
      this.kept.set(unopened);
  }
}
