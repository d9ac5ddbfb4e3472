import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Foot } from '../../foot/foot';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { draft } from '../drafts/draft';
import { SaveLine } from '../saving/save-line';
import { SecondWork } from './second-work';

interface Inspected {
  readonly seen: readonly string[];
  readonly note: string;
  readonly isWrong: boolean;
}

const nothing: Inspected = { seen: [], note: '', isWrong: false };

function isInspected(value: unknown): value is Inspected {
  return (
    typeof value === 'object' &&
    value !== null &&
    Array.isArray((value as Partial<Inspected>).seen) &&
    typeof (value as Partial<Inspected>).note === 'string' &&
    typeof (value as Partial<Inspected>).isWrong === 'boolean'
  );
}

/** An inspection: everything that is to be looked for, ticked one by one. */
@Component({
  selector: 'ss-inspect',
  imports: [Foot, MatButton, SaveLine, Sentence, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form (submit)="keep($event)">
      @if (lookFor().length > 0) {
        <fieldset class="ticks">
          <legend>Look for</legend>
          @for (item of lookFor(); track item) {
            <label class="tick">
              <input
                #tick
                type="checkbox"
                [checked]="typed().seen.includes(item)"
                (change)="see(item, tick.checked)"
              />
              <span><ss-sentence [text]="item" /></span>
            </label>
          }
        </fieldset>
      }
      <label class="tick">
        <input
          #wrong
          type="checkbox"
          [checked]="typed().isWrong"
          (change)="change({ isWrong: wrong.checked })"
        />
        <span>Something is wrong</span>
      </label>
      <label class="note">
        {{ typed().isWrong ? 'What is wrong?' : 'Note, if there is one' }}
        <textarea
          #note
          rows="2"
          maxlength="1000"
          [value]="typed().note"
          (input)="change({ note: note.value })"
        ></textarea>
      </label>
      @if (work.errorAt('content.seen') ?? work.errorAt('content.note'); as sentence) {
        <p class="field-error" role="alert"><ss-sign name="fail" />{{ sentence }}</p>
      }
      <ss-foot>
        <ss-save-line [of]="work.saving.state()" />
        <button
          matButton="filled"
          type="submit"
          [disabled]="!isWhole() || work.saving.state().state === 'saving'"
        >
          {{ typed().isWrong ? 'Keep it: wrong' : 'Keep it: seen and right' }}
        </button>
      </ss-foot>
    </form>
  `,
  styleUrl: './part.scss',
})
export class Inspect {
  protected readonly work = inject(SecondWork);

  readonly lookFor = input.required<readonly string[]>();

  protected readonly typed = draft(() => this.work.draftKey('inspected'), nothing, isInspected);
  protected readonly isWhole = computed(() => {
    const { isWrong, note, seen } = this.typed();
    return isWrong ? note.trim() !== '' : this.lookFor().every((item) => seen.includes(item));
  });

  protected see(item: string, isSeen: boolean): void {
    this.typed.update((typed) => ({
      ...typed,
      seen: isSeen ? [...typed.seen, item] : typed.seen.filter((other) => other !== item),
    }));
  }

  protected change(part: Partial<Inspected>): void {
    this.typed.update((typed) => ({ ...typed, ...part }));
  }

  protected async keep(event: Event): Promise<void> {
    event.preventDefault();
    const { isWrong, note, seen } = this.typed();
    if (!this.isWhole()) return;
    const kept = await this.work.keepReading({
      kind: 'inspected',
      outcome: isWrong ? 'fail' : 'pass',
      seen,
      note: note.trim() === '' ? undefined : note.trim(),
    });
    if (kept) this.typed.set(nothing);
  }
}
