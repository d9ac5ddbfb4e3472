import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { settlementWords } from '../settlement-words';
import { stepKindWords } from '@second-spanner/shared/sheet/words';
import { sourceText } from '@second-spanner/shared/spec/source-text';
import { Foot } from '../../foot/foot';
import { HoldPlate } from '../../hold-plate/hold-plate';
import { Cell } from '../../layout/cell';
import { WaitingTray } from '../../offline/waiting-tray';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { TradeWords } from '../../words/trade-words';
import { withoutRule } from '../judged/judged';
import { SaveLine } from '../saving/save-line';
import { SheetHead, type HeadCell } from '../sheet/sheet-head';
import { stageOf, stepAfter } from '../sheet/stage-progress';
import { SheetStore } from '../sheet-store';
import type { ShownStep } from '../shown-step';
import { StepWork } from '../step-work';
import { Wide } from '../wide';
import { CallButton } from './call-button';
import { Cautions } from './cautions';
import { CoveredPlate } from './covered-plate';
import { EntryList } from './entry-list';
import { holdAhead } from './hold-ahead';
import { StepActs } from './step-acts';
import { Waits } from './waits';

/** What every step's page has round its own work: head, cautions, what it waits for, the hold ahead, its entries. */
@Component({
  selector: 'ss-step-frame',
  imports: [
    CallButton,
    Cautions,
    Cell,
    CoveredPlate,
    EntryList,
    Foot,
    HoldPlate,
    MatButton,
    RouterLink,
    SaveLine,
    Sentence,
    SheetHead,
    Sign,
    StepActs,
    TradeWords,
    Waits,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './step-frame.html',
  styleUrl: './step-frame.scss',
})
export class StepFrame {
  protected readonly store = inject(SheetStore);
  protected readonly work = inject(StepWork);
  private readonly tray = inject(WaitingTray);

  readonly step = input.required<ShownStep>();
  /** The step's name where it says more than its title, such as the pass. */
  readonly name = input<string | null>(null);
  /** Beside the name on the desk. */
  readonly deskCells = input<readonly HeadCell[]>([]);
  /** In the phone's second row, behind stage and step. */
  readonly cells = input<readonly HeadCell[]>([]);
  /** Whether the work projected here has an action of its own at its foot. */
  readonly working = input.required<boolean>();

  protected readonly isDesk = inject(Wide).isDesk;
  protected readonly kindWords = stepKindWords;
  protected readonly settlementWords = settlementWords;
  protected readonly withoutRule = withoutRule;

  protected readonly stageTitle = computed(() => stageOf(this.step().code, this.store.stages())?.title ?? '');
  protected readonly phoneCells = computed<readonly HeadCell[]>(() => [
    { caption: 'Stage', value: String(this.step().stage), figures: true },
    { caption: 'Step', value: this.step().code, figures: true },
    ...this.cells(),
  ]);
  protected readonly source = computed(() => sourceText(this.step().definition.source));
  protected readonly rests = computed(() => {
    const { restsOn } = this.step().definition;
    return this.store.lines().filter(({ code }) => restsOn.includes(code));
  });
  protected readonly after = computed(() => stepAfter(this.step().code, this.store.stages()));
  protected readonly hold = computed(() =>
    this.store.sheet.hasValue() ? holdAhead(this.step(), this.store.sheet.value()) : null,
  );
  protected readonly secondLink = computed(() => {
    const { can, code } = this.step();
    const to = ['/sheets', this.store.id(), 'steps', code, 'second'];
    if (can.readAgain) return { to, words: secondWords[this.step().secondCheck ?? 'read-again'] };
    return can.countersign ? { to, words: `Countersign step ${code}` } : null;
  });
  protected readonly coveredSentence = computed(() =>
    this.step().can.readAgain
      ? 'You see it when yours is kept. Yours can’t be changed after that.'
      : 'It is shown when the second person has countersigned this step.',
  );
  protected readonly trayWords = computed(() => {
    const count = this.tray.count();
    if (count === 0) return 'Nothing in the waiting tray.';
    return count === 1 ? '1 entry in the waiting tray.' : `${count} entries in the waiting tray.`;
  });
}

const secondWords = {
  'measured-again': 'Measure it again',
  'strip-read-again': 'Read the strip again',
  'read-again': 'Read it again',
  'setting-and-pull-witnessed': 'Read the wrench, then watch',
  inspected: 'Inspect it',
} as const;
