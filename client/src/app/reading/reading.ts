import {
  afterRenderEffect,
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  model,
  signal,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { Quantity, Unit } from '@second-spanner/shared/contracts/quantity';
import { splitUnit } from '../fields/split-unit';
import { Sentence } from '../quantity/sentence';
import { Sign } from '../verdict/sign';
import { Keypad } from './keypad';
import { OwnKeypad } from './own-keypad';
import { readFigure } from './read-figure';
import { typeKey, type KeypadKey } from './type-key';

let fields = 0;

/**
 * The reading field: one big figure with its unit. Bind `text` and `unit` two ways and read `quantity`.
 * An error of its own (no figure) or the page's (`error`) stands under the field; what was typed stays.
 */
@Component({
  selector: 'ss-reading',
  imports: [Keypad, MatIcon, Sentence, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './reading.html',
  styleUrl: './reading.scss',
})
export class Reading {
  private readonly keypads = inject(OwnKeypad);
  private readonly box = viewChild.required<ElementRef<HTMLElement>>('box');
  private readonly field = viewChild.required<ElementRef<HTMLInputElement>>('field');

  readonly label = input.required<string>();
  readonly units = input.required<readonly Unit[]>();
  readonly unit = model.required<Unit>();
  readonly text = model('');
  readonly error = input<string | null>(null);
  readonly disabled = input(false);

  /** The figure as typed, in its unit; null while there is none. */
  readonly quantity = computed<Quantity | null>(() => this.read().quantity);

  private readonly read = computed(() => readFigure(this.text(), this.unit()));
  /** Whether a unit is typed with the figure, so that the one beside it does not hold. */
  protected readonly hasUnit = computed(() => splitUnit(this.text()).unit !== undefined);
  private readonly isTyping = signal(false);

  protected readonly id = `reading-${(fields += 1)}`;
  protected readonly own = this.keypads.isOwn;
  protected readonly keypadUp = computed(() => this.isTyping() && this.own() && !this.disabled());
  /** Half a figure is no error while it is being typed. */
  protected readonly shownError = computed(
    () => this.error() ?? (this.isTyping() ? null : this.read().error),
  );

  constructor() {
    // Once the keypad stands, the field and the judgement under it are moved above it.
    afterRenderEffect(() => {
      if (!this.keypadUp() || this.keypads.height() === 0) return;
      this.box().nativeElement.scrollIntoView({ block: 'nearest' });
    });
  }

  /** Puts the caret in the field. */
  focus(): void {
    this.field().nativeElement.focus();
  }

  protected type(): void {
    this.text.set(this.field().nativeElement.value);
  }

  protected press(key: KeypadKey): void {
    const field = this.field().nativeElement;
    const start = field.selectionStart ?? field.value.length;
    const typed = typeKey({ text: field.value, start, end: field.selectionEnd ?? start }, key);
    field.value = typed.text;
    field.setSelectionRange(typed.start, typed.end);
    this.text.set(typed.text);
  }

  protected begin(): void {
    this.isTyping.set(true);
  }

  protected end(): void {
    this.isTyping.set(false);
  }

  protected chooseUnit(event: Event): void {
    const chosen = this.units().find((unit) => unit === (event.target as HTMLSelectElement).value);
    if (chosen !== undefined) this.unit.set(chosen);
  }

  protected takeOwn(): void {
    this.keypads.choose(true);
    this.focus();
  }
}
