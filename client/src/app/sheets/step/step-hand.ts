import { NgComponentOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, input, type Type } from '@angular/core';
import type { ShownStep } from '../shown-step';
import { StepWork } from '../step-work';

/** The step at hand, worked in the way of its kind. Made anew for every step. */
@Component({
  selector: 'ss-step-hand',
  imports: [NgComponentOutlet],
  providers: [StepWork],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ng-container *ngComponentOutlet="work(); inputs: { step: step(), definition: step().definition }" />
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
  /** The work of the step's kind, as `loadWork` brings it. */
  readonly work = input.required<Type<unknown>>();
}
