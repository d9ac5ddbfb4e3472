import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Sentence } from '../quantity/sentence';
import { Sign } from '../verdict/sign';

/** What stands under a field: how it is filled, and what is wrong with it. The field's id names both. */
@Component({
  selector: 'ss-field-notes',
  imports: [Sentence, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (hint(); as words) {
      <p [id]="of() + '-hint'" class="small quiet"><ss-sentence [text]="words" /></p>
    }
    <p [id]="of() + '-error'" class="error" aria-live="polite">
      @if (error(); as words) {
        <ss-sign name="fail" /><ss-sentence [text]="words" />
      }
    </p>
  `,
  styles: `
    .quiet {
      padding-top: 2px;
    }

    .error:not(:empty) {
      display: flex;
      gap: var(--ss-2);
      padding-top: var(--ss-1);
      font: var(--ss-t-small);
    }
  `,
})
export class FieldNotes {
  readonly of = input.required<string>();
  readonly hint = input<string | null | undefined>();
  readonly error = input<string | undefined>();
}

/** The value of `aria-describedby` of a field with such notes. */
export function describedBy(id: string, hint: unknown, error: unknown): string | null {
  const notes = [...(hint ? [`${id}-hint`] : []), ...(error ? [`${id}-error`] : [])];
  return notes.length === 0 ? null : notes.join(' ');
}
