import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { SecondReadingView } from '@second-spanner/shared/contracts/sheets';
import { finalPass, planOf } from '@second-spanner/shared/sheet/plan-of';
import { DrawingFigure } from '../../drawing/drawing';
import { Foot } from '../../foot/foot';
import { Sentence } from '../../quantity/sentence';
import { SessionStore } from '../../session/session-store';
import { Sign } from '../../verdict/sign';
import { VerdictLine } from '../../verdict/verdict';
import { TradeWords } from '../../words/trade-words';
import { draft } from '../drafts/draft';
import { pullFigure, withCapital } from '../entry-words';
import { SaveLine } from '../saving/save-line';
import { SayWhy } from '../say-why/say-why';
import { SheetStore } from '../sheet-store';
import type { ShownStep } from '../shown-step';
import { goodTo } from '../tools/tool-words';
import { ToolsStore } from '../tools/tools-store';
import { bandsOf } from './compared-bands';
import { SecondWork } from './second-work';

const isListOfTexts = (value: unknown): value is readonly string[] =>
  Array.isArray(value) && value.every((each) => typeof each === 'string');

/** First and second side by side, whether they agree, and what the second person does about it. */
@Component({
  selector: 'ss-compared',
  imports: [
    DrawingFigure,
    Foot,
    MatButton,
    RouterLink,
    SaveLine,
    SayWhy,
    Sentence,
    Sign,
    TradeWords,
    VerdictLine,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './compared.html',
  styleUrls: ['./part.scss', './compared.scss'],
})
export class Compared {
  protected readonly work = inject(SecondWork);
  protected readonly store = inject(SheetStore);
  private readonly tools = inject(ToolsStore);
  private readonly sessions = inject(SessionStore);

  readonly step = input.required<ShownStep>();
  readonly own = input.required<SecondReadingView>();

  protected readonly witnessed = draft<readonly string[]>(
    () => this.work.draftKey('witnessed'),
    [],
    isListOfTexts,
  );
  protected readonly isCountersigned = computed(() => this.work.countersigned() !== null);
  protected readonly isBlind = computed(() => this.step().secondCheck !== 'inspected');
  protected readonly foundWords = computed(() => {
    const { verdict } = this.own().agreement;
    if (!this.isBlind()) return verdict === 'pass' ? 'seen and right' : 'something is wrong';
    return verdict === 'pass' ? 'the two readings agree' : 'the two readings do not agree';
  });
  private readonly current = computed(() => this.step().entries.filter((entry) => entry.current));
  protected readonly firstBy = computed(() =>
    [...new Set(this.current().map(({ by }) => by.name))].join(', '),
  );
  protected readonly bands = computed(() =>
    bandsOf(this.step().definition, this.current(), this.own().content, this.tools.all(), {
      dialect: this.sessions.dialect(),
    }),
  );
  protected readonly toolRows = computed(() => {
    const content = this.own().content;
    if (this.step().kind !== 'measurement') return null;
    const second = 'toolId' in content ? this.tools.byId(content.toolId) : undefined;
    const firstContent = this.current()[0]?.content;
    const first =
      firstContent !== undefined && 'toolId' in firstContent
        ? this.tools.byId(firstContent.toolId)
        : undefined;
    if (first === undefined || second === undefined) return null;
    return { first, second, firstGood: goodTo(first), secondGood: goodTo(second) };
  });

  /** The pulls of the last torque pass, as the builder makes them. */
  protected readonly witnessing = computed(() => {
    const { definition, secondCheck } = this.step();
    if (definition.kind !== 'tightening' || secondCheck !== 'setting-and-pull-witnessed') return null;
    const pass = finalPass(definition);
    const pulls = planOf(definition)
      .steps.filter((each) => each.pass === pass)
      .map(({ fastener }) => {
        const entry = this.current().find(
          ({ content }) =>
            content.kind === 'tightening' && content.pass === pass && content.fastener === fastener,
        );
        return {
          fastener,
          name: withCapital(`${definition.group.noun} ${fastener}`),
          words: entry?.content.kind === 'tightening' ? pullFigure(entry.content) : null,
        };
      });
    return { pass, pulls };
  });
  protected readonly allSeen = computed(() => {
    const pulls = this.witnessing()?.pulls ?? [];
    return pulls.every(({ fastener }) => this.witnessed().includes(fastener));
  });

  /** The normalised error without its sign, which only says who read more. */
  protected size(en: number): string {
    return Math.abs(en).toFixed(2);
  }

  protected witness(fastener: string, isSeen: boolean): void {
    this.witnessed.update((seen) =>
      isSeen ? [...seen, fastener] : seen.filter((other) => other !== fastener),
    );
  }

  protected async countersign(): Promise<void> {
    const pulls = this.witnessing() === null ? null : this.witnessed();
    if (await this.work.countersign(pulls)) this.witnessed.set([]);
  }
}
