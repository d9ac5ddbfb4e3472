import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  ElementRef,
  inject,
  output,
  type OnDestroy,
} from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { OwnKeypad } from './own-keypad';
import { keypadKeys, type KeypadKey } from './type-key';

const names: Partial<Record<KeypadKey, string>> = {
  back: 'Rub out',
  sign: 'Plus or minus',
  fraction: 'Fraction line',
  space: 'Space',
  '.': 'Point',
  ',': 'Comma',
};
const faces: Partial<Record<KeypadKey, string>> = { sign: '±', fraction: '⁄', space: '␣' };

/** The stand's own keypad over the lower part of the page. The field keeps the focus while it is used. */
@Component({
  selector: 'ss-keypad',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'group', 'aria-label': 'Keypad', '(mousedown)': '$event.preventDefault()' },
  templateUrl: './keypad.html',
  styleUrl: './keypad.scss',
})
export class Keypad implements OnDestroy {
  private readonly keypads = inject(OwnKeypad);

  readonly pressed = output<KeypadKey>();
  readonly closed = output();

  protected readonly rows = keypadKeys;

  constructor() {
    const host = inject<ElementRef<HTMLElement>>(ElementRef);
    afterNextRender(() => this.keypads.cover(host.nativeElement.offsetHeight));
  }

  ngOnDestroy(): void {
    this.keypads.cover(0);
  }

  protected nameOf(key: KeypadKey): string {
    return names[key] ?? key;
  }

  protected faceOf(key: KeypadKey): string {
    return faces[key] ?? key;
  }

  protected takeDevice(): void {
    this.keypads.choose(false);
  }
}
