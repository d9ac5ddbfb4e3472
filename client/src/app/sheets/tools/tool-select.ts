import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import { Sign } from '../../verdict/sign';
import { isPastDue, toolWords } from './tool-words';

let selects = 0;

/** Chooses a tool from the register: those made for the work first. */
@Component({
  selector: 'ss-tool-select',
  imports: [MatIcon, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="plate" [class.wrong]="error() !== null">
      <label class="caption" [for]="id">{{ label() }}</label>
      <select
        #choice
        [id]="id"
        [attr.aria-invalid]="error() !== null"
        [attr.aria-describedby]="error() === null ? null : id + '-error'"
        (change)="chosen.set(choice.value)"
      >
        <option value="" [selected]="chosen() === ''">Choose a tool</option>
        @for (option of options(); track option.id) {
          <option [value]="option.id" [selected]="option.id === chosen()">{{ option.words }}</option>
        }
      </select>
      <mat-icon svgIcon="down" />
    </div>
    @if (error(); as sentence) {
      <p class="small error" role="alert" [id]="id + '-error'"><ss-sign name="fail" />{{ sentence }}</p>
    }
  `,
  styleUrl: './tool-select.scss',
})
export class ToolSelect {
  readonly label = input('Tool');
  readonly tools = input.required<readonly Tool[]>();
  /** Id of the tool, or an empty text. */
  readonly chosen = model.required<string>();
  readonly error = input<string | null>(null);

  protected readonly id = `tool-${(selects += 1)}`;
  protected readonly options = computed(() => {
    const today = new Date().toISOString().slice(0, 10);
    return this.tools().map((tool) => ({
      id: tool.id,
      words: isPastDue(tool, today) ? `${toolWords(tool)}, calibration past due` : toolWords(tool),
    }));
  });
}
