import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ValveTimingStep } from '@second-spanner/shared/contracts/steps';
import { Foot } from '../../../foot/foot';
import { Sign } from '../../../verdict/sign';
import { Correction } from '../../correction/correction';
import { draft } from '../../drafts/draft';
import { SaveLine } from '../../saving/save-line';
import type { ShownStep } from '../../shown-step';
import { StepFrame } from '../../step/step-frame';
import { StepWork } from '../../step-work';
import { SightingFields } from './sighting-fields';
import { emptySightings, isSightingsDraft, readSightings, type SightingsDraft } from './sightings';
import { Told } from './told';

const unopened: SightingsDraft = { positions: [], about: -1 };

/** Valve timing: what was seen of the valves, and which TDC that tells, with the next thing to look for. */
@Component({
  selector: 'ss-valve-timing-work',
  imports: [Correction, Foot, MatButton, SaveLine, SightingFields, Sign, StepFrame, Told],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-step-frame
      [step]="step()"
      [working]="isEntering() || mayRepeat()"
      [cells]="cells()"
      [deskCells]="cells()"
    >
      @if (isEntering()) {
        <ss-correction [definition]="definition()" />
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
            Keep what was seen
          </button>
        </ss-foot>
      } @else {
        @if (recorded(); as sightings) {
          <ss-told [definition]="definition()" [seen]="sightings" />
        }
        @if (mayRepeat()) {
          <ss-foot>
            <button matButton="filled" type="button" (click)="work.choose('valve-timing')">Look again</button>
          </ss-foot>
        }
      }
    </ss-step-frame>
  `,
  styleUrl: '../work.scss',
})
export class ValveTimingWork {
  protected readonly work = inject(StepWork);

  readonly step = input.required<ShownStep>();
  readonly definition = input.required<ValveTimingStep>();

  protected readonly kept = draft(() => this.work.draftKey('sightings'), unopened, isSightingsDraft);
  protected readonly typed = computed(() =>
    this.kept().positions.length === 0 ? emptySightings(this.definition().cylinder) : this.kept(),
  );
  protected readonly seen = computed(() => readSightings(this.typed(), this.definition().firingOrder));
  protected readonly isEntering = computed(() => this.work.isOpen() && this.work.slot() !== null);
  protected readonly mayRepeat = computed(() => this.work.isOpen() && this.work.toRepeat() !== null);
  protected readonly recorded = computed(() => {
    const entry = this.step().entries.findLast(({ current }) => current);
    return entry?.content.kind === 'valve-timing' ? entry.content : null;
  });
  protected readonly cells = computed(() => [
    { caption: 'Order', value: this.definition().firingOrder.join('-'), figures: true },
    { caption: 'Asked about', value: `No. ${this.definition().cylinder}` },
  ]);

  protected async keep(): Promise<void> {
    const seen = this.seen();
    if (seen === null) return;
    const content = { kind: 'valve-timing' as const, ...seen };
    const { error } = this.work.judge(this.definition(), content);
    this.work.fieldError.set(error);
    if (error === null && (await this.work.record(this.definition(), content))) this.kept.set(unopened);
  }
}
