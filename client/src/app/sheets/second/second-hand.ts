import { NgComponentOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, viewChild } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { secondCheckWords } from '@second-spanner/shared/sheet/words';
import { Foot } from '../../foot/foot';
import { Network } from '../../http/network';
import { Sentence } from '../../quantity/sentence';
import { SessionStore } from '../../session/session-store';
import { laterPart } from '../../states/later-part';
import { LoadState } from '../../states/load-state';
import { Sign } from '../../verdict/sign';
import { withCapital } from '../entry-words';
import { SayWhy } from '../say-why/say-why';
import { SheetHead, type HeadCell } from '../sheet/sheet-head';
import { SheetStore } from '../sheet-store';
import type { ShownStep } from '../shown-step';
import { Cautions } from '../step/cautions';
import { CoveredPlate } from '../step/covered-plate';
import { checkOf, loadCompared, type SecondCheckPart } from './load-check';
import { SecondWork } from './second-work';

/** The second check at hand: the person's own reading, blind; then both side by side, to countersign or dispute. */
@Component({
  selector: 'ss-second-hand',
  imports: [
    Cautions,
    CoveredPlate,
    Foot,
    LoadState,
    MatButton,
    NgComponentOutlet,
    RouterLink,
    SayWhy,
    Sentence,
    SheetHead,
    Sign,
  ],
  providers: [SecondWork],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './second-hand.html',
  styleUrl: './second.scss',
})
export class SecondHand {
  protected readonly store = inject(SheetStore);
  protected readonly work = inject(SecondWork);
  private readonly sessions = inject(SessionStore);
  private readonly cannot = viewChild<SayWhy>('cannot');

  protected readonly reachable = inject(Network).reachable;

  readonly step = input.required<ShownStep>();

  protected readonly kindWords = computed(() => {
    const { secondCheck } = this.step();
    return secondCheck === null ? 'Second check' : withCapital(secondCheckWords[secondCheck]);
  });
  protected readonly caption = computed(() => `Second check, ${this.sessions.person()?.name ?? ''}`);
  protected readonly isBlind = computed(() => this.step().secondCheck !== 'inspected');
  protected readonly cells = computed<readonly HeadCell[]>(() => {
    const sheet = this.store.sheet.hasValue() ? this.store.sheet.value() : null;
    const { stage, code } = this.step();
    return [
      { caption: 'Stage', value: String(stage), figures: true },
      { caption: 'Step', value: code, figures: true },
      ...(sheet === null ? [] : [{ caption: `${sheet.carName}, engine`, value: sheet.engineCode }]),
    ];
  });
  /** What is done here: the own reading first, then both side by side. */
  protected readonly check = computed<SecondCheckPart | null>(() => {
    const step = this.step();
    if (step.can.readAgain) return checkOf(step);
    const own = this.work.own();
    return own && { load: loadCompared, inputs: { step, own } };
  });
  protected readonly part = laterPart(() => this.check()?.load);
  /** Why there is nothing to do here, where that is so. */
  protected readonly idle = computed(() => {
    const { can, secondCheck, critical, status } = this.step();
    if (can.readAgain || this.work.own() !== null) return null;
    if (!critical || secondCheck === null) return 'No second person checks this step.';
    if (status === 'done') return 'This step is countersigned.';
    if (this.step().entries.length > 0) return 'You recorded on this step: somebody else must check it.';
    return secondCheck === 'setting-and-pull-witnessed'
      ? 'The wrench is read when the passes before the last one are done.'
      : 'It can’t be checked yet: not everything on it is recorded and good.';
  });

  protected async sayCannot(words: string): Promise<void> {
    if (await this.work.sayCannot(words)) this.cannot()?.done();
  }
}
