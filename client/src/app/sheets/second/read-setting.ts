import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Unit } from '@second-spanner/shared/contracts/quantity';
import type { TighteningStepDefinition } from '@second-spanner/shared/contracts/steps';
import { finalPass } from '@second-spanner/shared/sheet/plan-of';
import { Foot } from '../../foot/foot';
import { Sentence } from '../../quantity/sentence';
import { readFigure } from '../../reading/read-figure';
import { Reading } from '../../reading/reading';
import { draft } from '../drafts/draft';
import { SaveLine } from '../saving/save-line';
import { ToolSelect } from '../tools/tool-select';
import { wrenchesOf } from '../tools/tools-for';
import { ToolsStore } from '../tools/tools-store';
import { chosenUnit, rememberUnit, unitsLike } from '../units/chosen-unit';
import { SecondWork } from './second-work';

const isText = (value: unknown): value is string => typeof value === 'string';

/** The wrench's setting, read blind before the last torque pass is pulled. */
@Component({
  selector: 'ss-read-setting',
  imports: [Foot, MatButton, Reading, SaveLine, Sentence, ToolSelect],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form (submit)="keep($event)">
      <p><ss-sentence [text]="task()" /></p>
      <ss-tool-select
        label="The wrench in the builder’s hand"
        [tools]="wrenches()"
        [chosen]="toolId()"
        [error]="work.errorAt('content.toolId')"
        (chosenChange)="takeTool($event)"
      />
      <ss-reading
        label="It is set to"
        [units]="units()"
        [unit]="unit()"
        [text]="typed()"
        [error]="work.errorAt('content.setting')"
        (textChange)="type($event)"
        (unitChange)="takeUnit($event)"
      />
      <ss-foot>
        <ss-save-line [of]="work.saving.state()" />
        <button
          matButton="filled"
          type="submit"
          [disabled]="content() === null || work.saving.state().state === 'saving'"
        >
          Keep my reading
        </button>
      </ss-foot>
    </form>
  `,
  styleUrl: './part.scss',
})
export class ReadSetting {
  protected readonly work = inject(SecondWork);
  private readonly register = inject(ToolsStore);

  readonly definition = input.required<TighteningStepDefinition>();

  protected readonly typed = draft(() => this.work.draftKey('setting'), '', isText);
  protected readonly toolId = draft(() => this.work.draftKey('wrench'), '', isText);
  protected readonly unit = linkedSignal<Unit>(() => chosenUnit(this.definition().torque.unit));
  protected readonly units = computed(() => unitsLike(this.definition().torque.unit));
  protected readonly wrenches = computed(() => wrenchesOf(this.register.all()));
  protected readonly task = computed(
    () =>
      `Read the wrench yourself before pass ${finalPass(this.definition())} is pulled. Then stay and watch each pull.`,
  );
  protected readonly content = computed(() => {
    const { quantity } = readFigure(this.typed(), this.unit());
    if (quantity === null || this.toolId() === '') return null;
    return { kind: 'setting-and-pull-witnessed' as const, toolId: this.toolId(), setting: quantity };
  });

  protected type(text: string): void {
    this.work.touched();
    this.typed.set(text);
  }

  protected takeTool(toolId: string): void {
    this.work.touched();
    this.toolId.set(toolId);
  }

  protected takeUnit(unit: Unit): void {
    this.unit.set(unit);
    rememberUnit(this.definition().torque.unit, unit);
  }

  protected async keep(event: Event): Promise<void> {
    event.preventDefault();
    const content = this.content();
    if (content !== null && (await this.work.keepReading(content))) this.typed.set('');
  }
}
