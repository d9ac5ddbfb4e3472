import { ChangeDetectionStrategy, Component, inject, input, viewChild } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { TighteningStepDefinition } from '@second-spanner/shared/contracts/steps';
import { DrawingFigure } from '../../../drawing/drawing';
import { Foot } from '../../../foot/foot';
import { QuantityText } from '../../../quantity/quantity';
import { Reading } from '../../../reading/reading';
import { Sign } from '../../../verdict/sign';
import { Correction } from '../../correction/correction';
import { Judged } from '../../judged/judged';
import { SaveLine } from '../../saving/save-line';
import type { ShownStep } from '../../shown-step';
import { StepFrame } from '../../step/step-frame';
import { StepWork } from '../../step-work';
import { ToolSelect } from '../../tools/tool-select';
import { AdapterFields } from './adapter-fields';
import { PullState } from './pull-state';

/** A tightening: one fastener at a time in order, pass by pass, each pull recorded by itself. */
@Component({
  selector: 'ss-tightening-work',
  imports: [
    AdapterFields,
    Correction,
    DrawingFigure,
    Foot,
    Judged,
    MatButton,
    QuantityText,
    Reading,
    SaveLine,
    Sign,
    StepFrame,
    ToolSelect,
  ],
  providers: [PullState],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './tightening-work.html',
  styleUrls: ['../work.scss', './tightening-work.scss'],
})
export class TighteningWork {
  protected readonly work = inject(StepWork);
  protected readonly state = inject(PullState);

  readonly step = input.required<ShownStep>();
  readonly definition = input.required<TighteningStepDefinition>();

  private readonly field = viewChild(Reading);

  /** Touching the drawing does what the list of fasteners does. */
  protected touch(part: string): void {
    const [kind, fastener] = part.split(':');
    if (kind === 'fastener' && fastener !== undefined && this.work.isOpen())
      this.state.chooseFastener(fastener);
  }

  protected async keep(event: Event): Promise<void> {
    event.preventDefault();
    const kept = this.state.keep();
    this.field()?.focus();
    await kept;
  }
}
