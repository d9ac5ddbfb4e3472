import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';

let choices = 0;

/** One of a few: a legend, and a row for each choice that can be hit with a thumb. */
@Component({
  selector: 'ss-choice',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <fieldset>
      <legend>{{ legend() }}</legend>
      @if (hint(); as text) {
        <p class="small quiet">{{ text }}</p>
      }
      @for (choice of choices(); track choice.value) {
        <label>
          <input
            type="radio"
            [name]="name"
            [value]="choice.value"
            [checked]="choice.value === chosen()"
            (change)="choose.emit(choice.value)"
          />
          {{ choice.name }}
        </label>
      }
    </fieldset>
  `,
  styles: `
    fieldset {
      margin: 0;
      padding: 0;
      border: 0;
    }

    legend {
      padding: 0;
      font: var(--ss-t-strong);
    }

    label {
      display: flex;
      align-items: center;
      gap: var(--ss-3);
      min-height: 48px;
      border-bottom: var(--ss-hair) solid var(--ss-rule);
      cursor: pointer;
    }

    input {
      flex: none;
      width: 20px;
      height: 20px;
      margin: 0;
      accent-color: var(--ss-blue);
    }

    @media (min-width: 960px) {
      label {
        min-height: 40px;
      }
    }
  `,
})
export class Choice {
  readonly legend = input.required<string>();
  readonly hint = input<string>();
  readonly choices = input.required<readonly { readonly value: string; readonly name: string }[]>();
  readonly chosen = input.required<string>();
  readonly choose = output<string>();

  protected readonly name = `choice-${(choices += 1)}`;
}
