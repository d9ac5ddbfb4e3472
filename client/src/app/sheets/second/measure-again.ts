import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Unit } from '@second-spanner/shared/contracts/quantity';
import type { MeasurementStep } from '@second-spanner/shared/contracts/steps';
import { DrawingFigure } from '../../drawing/drawing';
import { Foot } from '../../foot/foot';
import { Sentence } from '../../quantity/sentence';
import { readFigure } from '../../reading/read-figure';
import { Reading } from '../../reading/reading';
import { SessionStore } from '../../session/session-store';
import { draft } from '../drafts/draft';
import { placeDrawing } from '../kinds/measurement/place-drawing';
import { SaveLine } from '../saving/save-line';
import { ToolSelect } from '../tools/tool-select';
import { toolsForReading } from '../tools/tools-for';
import { ToolsStore } from '../tools/tools-store';
import { chosenUnit, limitsInWords, rememberUnit, unitsLike } from '../units/chosen-unit';
import { isTextByPlace, type TextByPlace } from './text-by-place';
import { SecondWork } from './second-work';

const nothing: TextByPlace = {};

/** Measured again with one's own tool, or the strip read again: each place, without the first figure in sight. */
@Component({
  selector: 'ss-measure-again',
  imports: [DrawingFigure, Foot, MatButton, Reading, SaveLine, Sentence, ToolSelect],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (where(); as drawing) {
      <ss-drawing [of]="drawing" [bare]="true" [widest]="480" />
    }
    <form (submit)="keep($event)">
      <p class="small quiet">From, to <ss-sentence [text]="limits()" /></p>
      <ss-tool-select
        [label]="isStrip() ? 'The strip’s scale' : 'Your own tool, not the builder’s'"
        [tools]="tools()"
        [chosen]="toolId()"
        [error]="work.errorAt('content.toolId')"
        (chosenChange)="takeTool($event)"
      />
      @for (place of definition().at; track place; let i = $index) {
        <ss-reading
          [label]="definition().at.length === 1 ? 'Your reading' : 'Your reading, ' + place"
          [units]="units()"
          [unit]="unit()"
          [text]="typed()[place] ?? ''"
          [error]="
            work.errorAt('content.readings[' + i + '].value') ?? work.errorAt('content.readings[' + i + ']')
          "
          (textChange)="type(place, $event)"
          (unitChange)="takeUnit($event)"
        />
      }
      <ss-foot>
        <ss-save-line [of]="work.saving.state()" />
        <button
          matButton="filled"
          type="submit"
          [disabled]="content() === null || work.saving.state().state === 'saving'"
        >
          {{ definition().at.length === 1 ? 'Keep my reading' : 'Keep my readings' }}
        </button>
      </ss-foot>
    </form>
  `,
  styleUrl: './part.scss',
})
export class MeasureAgain {
  protected readonly work = inject(SecondWork);
  private readonly register = inject(ToolsStore);
  private readonly sessions = inject(SessionStore);

  readonly definition = input.required<MeasurementStep>();
  readonly isStrip = input.required<boolean>();

  protected readonly typed = draft(() => this.work.draftKey('readings'), nothing, isTextByPlace);
  protected readonly unit = linkedSignal<Unit>(() => chosenUnit(this.definition().unit));
  protected readonly units = computed(() => unitsLike(this.definition().unit));
  protected readonly toolId = linkedSignal(() => this.register.lastFor(this.memory()));
  protected readonly tools = computed(() => {
    const { unit, method } = this.definition();
    return toolsForReading(this.register.all(), unit, method);
  });
  protected readonly where = computed(() =>
    placeDrawing(this.definition(), null, { dialect: this.sessions.dialect() }),
  );
  protected readonly limits = computed(() => limitsInWords(this.definition().limits, this.unit()));
  protected readonly content = computed(() => {
    const readings = this.definition().at.flatMap((at) => {
      const { quantity } = readFigure(this.typed()[at] ?? '', this.unit());
      return quantity === null ? [] : [{ at, value: quantity }];
    });
    if (readings.length < this.definition().at.length || this.toolId() === '') return null;
    const kind = this.isStrip() ? ('strip-read-again' as const) : ('measured-again' as const);
    return { kind, toolId: this.toolId(), readings };
  });
  private readonly memory = computed(() => `second.${this.definition().method}`);

  protected type(place: string, text: string): void {
    this.work.touched();
    this.typed.update((typed) => ({ ...typed, [place]: text }));
  }

  protected takeUnit(unit: Unit): void {
    this.unit.set(unit);
    rememberUnit(this.definition().unit, unit);
  }

  protected takeTool(toolId: string): void {
    this.work.touched();
    this.toolId.set(toolId);
    this.register.rememberFor(this.memory(), toolId);
  }

  protected async keep(event: Event): Promise<void> {
    event.preventDefault();
    const content = this.content();
    if (content !== null && (await this.work.keepReading(content))) this.typed.set(nothing);
  }
}
