import { NgComponentOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import type { WiringStep } from '@second-spanner/shared/contracts/steps';
import { rotationOnCap } from '@second-spanner/shared/drawing/cap-input';
import { Foot } from '../../../foot/foot';
import { SessionStore } from '../../../session/session-store';
import { laterPart, type LoadPart } from '../../../states/later-part';
import { LoadState } from '../../../states/load-state';
import { TradeWords } from '../../../words/trade-words';
import { Correction } from '../../correction/correction';
import { draft } from '../../drafts/draft';
import { SaveLine } from '../../saving/save-line';
import type { HeadCell } from '../../sheet/sheet-head';
import type { ShownStep } from '../../shown-step';
import { StepFrame } from '../../step/step-frame';
import { StepWork } from '../../step-work';
import { cylindersByOutlet, isFittedDraft, nothingFitted, outletsOf, type FittedDraft } from './fitted';
import { FittedFields } from './fitted-fields';

const loadDiagnosis: LoadPart = async () => (await import('./diagnosis')).Diagnosis;

/**
 * Wiring: what is fitted is entered by outlet, with the required map out of sight until it is kept; then the map,
 * what is wrong, and the swaps that put it right.
 */
@Component({
  selector: 'ss-wiring-work',
  imports: [
    Correction,
    FittedFields,
    Foot,
    LoadState,
    MatButton,
    NgComponentOutlet,
    SaveLine,
    StepFrame,
    TradeWords,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './wiring-work.html',
  styleUrl: '../work.scss',
})
export class WiringWork {
  protected readonly work = inject(StepWork);
  private readonly sessions = inject(SessionStore);

  readonly step = input.required<ShownStep>();
  readonly definition = input.required<WiringStep>();

  protected readonly fitted = draft(() => this.work.draftKey('fitted'), nothingFitted, isFittedDraft);
  protected readonly isEntering = computed(() => this.work.isOpen() && this.work.slot() !== null);
  protected readonly isWhole = computed(() =>
    outletsOf(this.definition()).every((outlet) => (this.fitted()[outlet] ?? '') !== ''),
  );
  protected readonly fittedError = computed(() => {
    const field = this.work.fieldError()?.field ?? '';
    return field.startsWith('fitted')
      ? (this.work.fieldError()?.message ?? null)
      : this.work.errorAt('content.fitted');
  });
  protected readonly kept = computed(() => {
    const entry = this.step().entries.findLast(({ current }) => current);
    return entry?.content.kind === 'wiring' ? entry.content.fitted : null;
  });
  private readonly isKept = computed(() => !this.isEntering() && this.kept() !== null);
  /** Shown, and downloaded, when the leads are in. */
  protected readonly diagnosis = laterPart(() => (this.isKept() ? loadDiagnosis : undefined));
  protected readonly mayMove = computed(() => this.work.isOpen() && this.work.toRepeat() !== null);
  protected readonly cells = computed<readonly HeadCell[]>(() => {
    const { cap } = this.definition();
    return [
      { caption: 'Order', value: cap.firingOrder.join('-'), figures: true },
      {
        caption: 'Rotor, from the cap',
        value: this.say(rotationOnCap(cap) === 'clockwise' ? 'clockwise' : '{anticlockwise}'),
      },
    ];
  });

  protected fit(fitted: FittedDraft): void {
    this.work.touched();
    this.fitted.set(fitted);
  }

  /** The leads were moved: read them all again, beginning from nothing. */
  protected readAgain(): void {
    this.fitted.set(nothingFitted);
    if (this.work.reason() === '') this.work.reason.set(this.say('{Leads} moved'));
    this.work.choose('wiring');
  }

  protected async keep(): Promise<void> {
    const fitted = cylindersByOutlet(this.definition(), this.fitted());
    const content = { kind: 'wiring' as const, fitted };
    const { error } = this.work.judge(this.definition(), content);
    this.work.fieldError.set(error);
    if (error !== null) return;
    if (await this.work.record(this.definition(), content)) this.fitted.set(nothingFitted);
  }

  private say(text: string): string {
    return tradeText(text, this.sessions.dialect());
  }
}
