import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  viewChild,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Unit } from '@second-spanner/shared/contracts/quantity';
import type { EntryContent, MeasurementStep } from '@second-spanner/shared/contracts/steps';
import { DrawingFigure } from '../../../drawing/drawing';
import { Foot } from '../../../foot/foot';
import { readFigure } from '../../../reading/read-figure';
import { Reading } from '../../../reading/reading';
import { Sentence } from '../../../quantity/sentence';
import { SessionStore } from '../../../session/session-store';
import { Correction } from '../../correction/correction';
import { draft } from '../../drafts/draft';
import { Judged } from '../../judged/judged';
import { SaveLine } from '../../saving/save-line';
import type { ShownStep } from '../../shown-step';
import { StepFrame } from '../../step/step-frame';
import { StepWork } from '../../step-work';
import { ToolSelect } from '../../tools/tool-select';
import { toolsForReading } from '../../tools/tools-for';
import { ToolsStore } from '../../tools/tools-store';
import { chosenUnit, limitsInWords, rememberUnit, unitsLike } from '../../units/chosen-unit';
import { bandIn } from './band';
import { placeDrawing } from './place-drawing';
import { Places } from './places';
import { isReadingDraft, noReading, withReading } from './reading-draft';

/** A measurement: a reading at each place, judged at its limits as it is typed. */
@Component({
  selector: 'ss-measurement-work',
  imports: [
    Correction,
    DrawingFigure,
    Foot,
    Judged,
    MatButton,
    Places,
    Reading,
    SaveLine,
    Sentence,
    StepFrame,
    ToolSelect,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './measurement-work.html',
  styleUrl: '../work.scss',
})
export class MeasurementWork {
  protected readonly work = inject(StepWork);
  private readonly tools = inject(ToolsStore);
  private readonly sessions = inject(SessionStore);

  readonly step = input.required<ShownStep>();
  readonly definition = input.required<MeasurementStep>();

  private readonly typed = draft(() => this.work.draftKey('reading'), noReading, isReadingDraft);
  protected readonly toolId = linkedSignal(() => this.tools.lastFor(this.definition().method));
  protected readonly unit = linkedSignal<Unit>(() => chosenUnit(this.definition().unit));
  protected readonly units = computed(() => unitsLike(this.definition().unit));
  protected readonly ableTools = computed(() => {
    const { unit, method } = this.definition();
    return toolsForReading(this.tools.all(), unit, method);
  });

  private readonly field = viewChild(Reading);

  protected readonly isEntering = computed(() => this.work.isOpen() && this.work.slot() !== null);
  protected readonly place = computed(() => this.work.slot()?.label ?? '');
  protected readonly text = computed(() => this.typed()[this.work.slot()?.key ?? ''] ?? '');
  protected readonly limits = computed(() => limitsInWords(this.definition().limits, this.unit()));
  protected readonly content = computed<EntryContent | null>(() => {
    const { quantity } = readFigure(this.text(), this.unit());
    return quantity && { kind: 'measurement', at: this.place(), value: quantity, toolId: this.toolId() };
  });
  private readonly judged = computed(() => {
    const content = this.content();
    return content === null ? null : this.work.judge(this.definition(), content);
  });
  protected readonly judgement = computed(() => this.judged()?.judgement ?? null);
  protected readonly valueError = computed(() => this.errorAt('content.value'));
  protected readonly toolError = computed(() => this.errorAt('content.toolId'));
  protected readonly band = computed(() => {
    const content = this.content();
    const tool = this.tools.byId(this.toolId());
    const readings =
      content?.kind === 'measurement' && this.valueError() === null
        ? [
            {
              value: content.value,
              tool,
              role: 'first' as const,
              label: 'reading',
              verdict: this.judgement()?.verdict,
            },
          ]
        : [];
    return bandIn(this.definition().limits, this.unit(), readings, { dialect: this.sessions.dialect() });
  });
  protected readonly where = computed(() => {
    if (this.step().covered) return null;
    const content = this.content();
    const reading = content?.kind === 'measurement' && this.judged()?.error === null ? content.value : null;
    return placeDrawing(this.definition(), reading, { dialect: this.sessions.dialect() });
  });
  protected readonly cells = computed(() => [{ caption: 'From, to', value: this.limits() }]);
  protected readonly keepWords = computed(() => {
    const following = this.work.following();
    return following === null ? 'Keep it' : `Keep it, go to ${following.label}`;
  });

  protected type(text: string): void {
    this.work.touched();
    this.typed.update((typed) => withReading(typed, this.work.slot()?.key ?? '', text));
  }

  protected takeUnit(unit: Unit): void {
    this.unit.set(unit);
    rememberUnit(this.definition().unit, unit);
  }

  protected takeTool(toolId: string): void {
    this.work.touched();
    this.toolId.set(toolId);
    this.tools.rememberFor(this.definition().method, toolId);
  }

  protected async keep(event: Event): Promise<void> {
    event.preventDefault();
    const content = this.content();
    const error = this.judged()?.error ?? null;
    this.work.fieldError.set(error);
    if (content === null || error !== null) return;
    const slot = this.work.slot()?.key ?? '';
    const kept = this.work.record(this.definition(), content);
    this.field()?.focus();
    if (await kept) this.typed.update((typed) => withReading(typed, slot, ''));
  }

  /** A tool not chosen yet is no error before one wants to keep the reading. */
  private errorAt(field: string): string | null {
    const live = this.judged()?.error ?? null;
    if (live !== null && live.field.startsWith(field) && live.field !== 'content.toolId') return live.message;
    return this.work.errorAt(field);
  }
}
