import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { CheckWork } from '../kinds/check/check-work';
import { MeasurementWork } from '../kinds/measurement/measurement-work';
import { PhotoWork } from '../kinds/photo/photo-work';
import { TighteningWork } from '../kinds/tightening/tightening-work';
import { ValveTimingWork } from '../kinds/valve-timing/valve-timing-work';
import { WiringWork } from '../kinds/wiring/wiring-work';
import type { ShownStep } from '../shown-step';
import { StepWork } from '../step-work';

/** The step at hand, worked in the way of its kind. Made anew for every step. */
@Component({
  selector: 'ss-step-hand',
  imports: [CheckWork, MeasurementWork, PhotoWork, TighteningWork, ValveTimingWork, WiringWork],
  providers: [StepWork],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let one = step();
    @switch (one.definition.kind) {
      @case ('check') {
        <ss-check-work [step]="one" [definition]="one.definition" />
      }
      @case ('measurement') {
        <ss-measurement-work [step]="one" [definition]="one.definition" />
      }
      @case ('tightening') {
        <ss-tightening-work [step]="one" [definition]="one.definition" />
      }
      @case ('wiring') {
        <ss-wiring-work [step]="one" [definition]="one.definition" />
      }
      @case ('valve-timing') {
        <ss-valve-timing-work [step]="one" [definition]="one.definition" />
      }
      @case ('photo') {
        <ss-photo-work [step]="one" [definition]="one.definition" />
      }
    }
  `,
  styles: `
    :host {
      display: flex;
      flex-direction: column;
      flex: 1;
    }
  `,
})
export class StepHand {
  readonly step = input.required<ShownStep>();
}
