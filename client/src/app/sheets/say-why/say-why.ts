import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { draft } from '../drafts/draft';
import { SaveLine } from '../saving/save-line';
import type { Saving } from '../saving/save-state';
import { Sign } from '../../verdict/sign';

let forms = 0;

const isText = (value: unknown): value is string => typeof value === 'string';

/**
 * An act that takes a sentence: a text button that opens a field and the act's own button. What is typed stays until
 * the act went through; call `done()` then.
 */
@Component({
  selector: 'ss-say-why',
  imports: [MatButton, SaveLine, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './say-why.html',
  styleUrl: './say-why.scss',
})
export class SayWhy {
  /** The button that opens the field. */
  readonly opener = input.required<string>();
  readonly label = input.required<string>();
  readonly hint = input<string | null>(null);
  readonly act = input.required<string>();
  readonly saving = input.required<Saving>();
  /** The path under which the api speaks of this field. */
  readonly field = input('reason');
  readonly draftKey = input.required<string>();
  readonly said = output<string>();

  protected readonly id = `say-why-${(forms += 1)}`;
  protected readonly text = draft(() => this.draftKey(), '', isText);
  protected readonly isOpened = signal(false);
  protected readonly isOpen = computed(() => this.isOpened() || this.text() !== '');
  private readonly wasEmpty = signal(false);
  protected readonly error = computed(() => {
    const standing = this.saving().state();
    if (this.wasEmpty() && this.text().trim() === '') return 'Say it in a sentence.';
    return standing.state === 'failed' ? standing.problem.errorAt(this.field()) : null;
  });

  /** Empties and closes the field. */
  done(): void {
    this.text.set('');
    this.isOpened.set(false);
  }

  protected close(): void {
    this.done();
  }

  protected say(event: Event): void {
    event.preventDefault();
    const text = this.text().trim();
    this.wasEmpty.set(text === '');
    if (text !== '') this.said.emit(text);
  }
}
