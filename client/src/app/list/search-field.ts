import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';

/** The field over a list: shows as you type what holds every word. */
@Component({
  selector: 'ss-search-field',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label>
      <span class="caption">{{ label() }}</span>
      <input #field type="search" autocomplete="off" [value]="text()" (input)="changed.emit(field.value)" />
    </label>
  `,
  styles: `
    label {
      display: block;
      margin-bottom: var(--ss-3);
    }

    .caption {
      display: block;
      margin-bottom: 2px;
    }

    input {
      width: 100%;
      max-width: 420px;
      min-height: 48px;
      padding: 0 12px;
      background: var(--ss-plate);
      border: 1px solid var(--ss-thin);
      border-radius: 2px;

      &:focus-visible {
        outline: 2px solid var(--ss-blue);
        outline-offset: -1px;
      }
    }

    @media (min-width: 960px) {
      input {
        min-height: 40px;
      }
    }
  `,
})
export class SearchField {
  readonly label = input.required<string>();
  readonly text = input.required<string>();
  readonly changed = output<string>();
}
