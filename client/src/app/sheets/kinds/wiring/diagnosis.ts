import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { Cylinder } from '@second-spanner/shared/contracts/calculations';
import type { WiringStep } from '@second-spanner/shared/contracts/steps';
import { drawCap } from '@second-spanner/shared/drawing/cap';
import { drawSparkStrip } from '@second-spanner/shared/drawing/spark-strip';
import { capMap } from '@second-spanner/shared/ignition/cap-map';
import { diagnoseWiring } from '@second-spanner/shared/sheet/judge-wiring';
import { DrawingFigure } from '../../../drawing/drawing';
import { Sentence } from '../../../quantity/sentence';
import { SessionStore } from '../../../session/session-store';
import { VerdictLine } from '../../../verdict/verdict';
import { TradeWords } from '../../../words/trade-words';
import { CautionSign } from '../../step/caution-sign';
import {
  causeTitles,
  sparkWords,
  swapCaption,
  swapLines,
  thenWords,
} from '@second-spanner/shared/workings/wiring-map/diagnosis-words';

/** What is fitted against the map: which mistake it is, the fewest swaps that cure it, and what each spark would do. */
@Component({
  selector: 'ss-diagnosis',
  imports: [CautionSign, DrawingFigure, Sentence, TradeWords, VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './diagnosis.html',
  styleUrl: './diagnosis.scss',
})
export class Diagnosis {
  private readonly sessions = inject(SessionStore);

  readonly definition = input.required<WiringStep>();
  /** By outlet. */
  readonly fitted = input.required<Readonly<Record<string, Cylinder>>>();

  private readonly options = computed(() => ({ dialect: this.sessions.dialect() }));
  protected readonly diagnosis = computed(() => diagnoseWiring(this.definition(), this.fitted()));
  protected readonly title = computed(() => causeTitles[this.diagnosis().cause]);
  protected readonly cap = computed(() => {
    const { cap } = this.definition();
    return drawCap(
      {
        map: capMap(cap),
        request: cap,
        fitted: this.fitted(),
        fittedBy: 'outlet',
        diagnosis: this.diagnosis(),
        showRequired: true,
      },
      this.options(),
    );
  });
  protected readonly strip = computed(() =>
    drawSparkStrip({ request: this.definition(), diagnosis: this.diagnosis() }, this.options()),
  );
  protected readonly swapTitle = computed(() => swapCaption(this.diagnosis().swaps.length));
  protected readonly swaps = computed(() => swapLines(this.fitted(), this.diagnosis().swaps));
  protected readonly sparks = computed(() =>
    this.diagnosis().cylinders.map((spark) => ({
      cylinder: spark.cylinder,
      when: sparkWords(spark),
      then: thenWords(spark),
    })),
  );
  protected readonly alsoFits = computed(() =>
    this.diagnosis()
      .alsoFits.map((cause) => causeTitles[cause])
      .join(', '),
  );
}
