import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { InputError } from '@second-spanner/shared/contracts/input-error';
import type { WhichTdc } from '@second-spanner/shared/contracts/calculations';
import type { ValveTimingStep } from '@second-spanner/shared/contracts/steps';
import { drawValveClock } from '@second-spanner/shared/drawing/valve-clock';
import { tellTdc, type Sightings } from '@second-spanner/shared/sheet/judge-tdc';
import { firingAngles } from '@second-spanner/shared/valve-train/firing-angles';
import { valveClock } from '@second-spanner/shared/valve-train/valve-clock';
import { DrawingFigure } from '../../../drawing/drawing';
import { Sentence } from '../../../quantity/sentence';
import { SessionStore } from '../../../session/session-store';
import { VerdictLine } from '../../../verdict/verdict';
import type { SignName } from '../../../verdict/signs';

const answers = {
  'compression-tdc': 'compression TDC',
  'exhaust-tdc': 'exhaust TDC',
  'cannot-tell': 'can’t be told yet',
  contradiction: 'what was seen contradicts itself',
} as const;

/** Which TDC the sightings tell, as they are entered, what to look for next, and the valve clock standing there. */
@Component({
  selector: 'ss-told',
  imports: [DrawingFigure, Sentence, VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div aria-live="polite">
      @if (answer(); as told) {
        <ss-verdict [of]="told.sign" [word]="told.word" [sentence]="told.reason" />
        @if (told.next; as next) {
          <p class="next"><strong>Next:</strong>&ngsp;<ss-sentence [text]="next" /></p>
        }
      } @else if (problem(); as sentence) {
        <ss-verdict of="waiting" [sentence]="sentence" />
      } @else {
        <p class="quiet">Enter what you see, and it is told at once which TDC it is.</p>
      }
    </div>
    <ss-drawing [of]="clock().drawing" [caption]="clock().caption" [bare]="true" [widest]="400" />
  `,
  styles: `
    :host {
      display: grid;
      gap: var(--ss-3);
    }

    .next {
      margin-top: var(--ss-2);
    }
  `,
})
export class Told {
  private readonly sessions = inject(SessionStore);

  readonly definition = input.required<ValveTimingStep>();
  readonly seen = input.required<Sightings | null>();

  private readonly told = computed<{ readonly told: WhichTdc | null; readonly problem: string | null }>(
    () => {
      const seen = this.seen();
      if (seen === null) return { told: null, problem: null };
      try {
        return { told: tellTdc(this.definition(), seen), problem: null };
      } catch (error) {
        if (error instanceof InputError) return { told: null, problem: error.message };
        throw error;
      }
    },
  );
  protected readonly problem = computed(() => this.told().problem);
  protected readonly answer = computed(() => {
    const { told } = this.told();
    if (told === null) return null;
    const { answer, reason, next } = told;
    const isWanted = answer === this.definition().wanted;
    const isOther = answer === 'compression-tdc' || answer === 'exhaust-tdc';
    const sign: SignName = isWanted
      ? 'pass'
      : isOther
        ? 'fail'
        : answer === 'contradiction'
          ? 'doubtful'
          : 'waiting';
    return { sign, word: `No. ${this.definition().cylinder}: ${answers[answer]}`, reason, next };
  });
  /** The clock at the TDC that was told; before that, at the one that the step wants, and it says so. */
  protected readonly clock = computed(() => {
    const { firingOrder, valveTiming, cylinder, wanted } = this.definition();
    const answer = this.told().told?.answer;
    const tdc = answer === 'compression-tdc' || answer === 'exhaust-tdc' ? answer : wanted;
    const firesAt =
      firingAngles(firingOrder, undefined).find((each) => each.cylinder === cylinder)?.firesAt ?? 0;
    const crank = (firesAt + (tdc === 'exhaust-tdc' ? 360 : 0)) % 720;
    const drawing = drawValveClock(
      { request: { valveTiming, crank }, clock: valveClock({ firingOrder, valveTiming, crank }) },
      { dialect: this.sessions.dialect() },
    );
    const at = `No. ${cylinder} at ${answers[tdc]}`;
    return {
      drawing,
      caption: tdc === answer ? `Valve clock with ${at}, as told` : `Valve clock with ${at}, as wanted`,
    };
  });
}
