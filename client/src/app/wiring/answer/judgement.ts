import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { cureInWords } from '@second-spanner/shared/ignition/cure-in-words';
import {
  causeTitles,
  swapCaption,
  swapLines,
} from '@second-spanner/shared/workings/wiring-map/diagnosis-words';
import { CautionSign } from '../../sheets/step/caution-sign';
import { Sentence } from '../../quantity/sentence';
import { signOf, signWords } from '../../verdict/signs';
import { VerdictLine } from '../../verdict/verdict';
import { TradeWords } from '../../words/trade-words';
import { spoken } from '@second-spanner/shared/workings/wiring-map/spoken';
import type { WiringAnswer } from '@second-spanner/shared/workings/wiring-map/work-out';

/** What is said of the leads as fitted: verdict, cause, the swaps that cure it, cautions. Before that, of the map. */
@Component({
  selector: 'ss-judgement',
  imports: [CautionSign, Sentence, TradeWords, VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './judgement.html',
  styleUrl: './judgement.scss',
})
export class Judgement {
  readonly answer = input.required<WiringAnswer>();

  protected readonly found = computed(() => {
    const { diagnosis, fitted } = this.answer();
    if (diagnosis === null || fitted === null) return null;
    return {
      verdict: diagnosis.verdict,
      title: causeTitles[diagnosis.cause],
      // The swap plate says the cure, step by step.
      reason: spoken(diagnosis.reason.replace(cureInWords(diagnosis.swaps), '').trim()),
      swapTitle: swapCaption(diagnosis.swaps.length),
      swaps: swapLines(fitted, diagnosis.swaps),
      alsoFits: diagnosis.alsoFits.map((cause) => causeTitles[cause]).join(', '),
      cautions: diagnosis.cautions.map(spoken),
    };
  });
  /** Told aloud when it changes: the verdict in short, not the whole of it at every key. */
  protected readonly aloud = computed(() => {
    const found = this.found();
    return found === null ? this.toGo() : `${signWords[signOf(found.verdict)]}: ${found.title}`;
  });
  protected readonly mapReason = computed(() => spoken(this.answer().map?.reason ?? ''));
  protected readonly toGo = computed(() => {
    const { entered, places } = this.answer();
    return entered === 0
      ? 'Enter the {leads} as fitted to see whether they are right.'
      : `${entered} of ${places.length} {leads} entered.`;
  });
}
