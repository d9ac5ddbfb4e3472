import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { SignName } from './signs';

/** A verdict's shape, told apart without colour. Never alone: its word stands beside it. */
@Component({
  selector: 'ss-sign',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { 'aria-hidden': 'true', '[class]': 'name()' },
  template: `
    <svg viewBox="0 0 20 20" focusable="false">
      @switch (name()) {
        @case ('pass') {
          <circle cx="10" cy="10" r="9" />
          <path class="cut" d="M5.6 10.2l3.1 3.1 5.8-6.4" />
        }
        @case ('fail') {
          <rect x="1.5" y="1.5" width="17" height="17" />
          <path class="cut" d="M6 6l8 8M14 6l-8 8" />
        }
        @case ('doubtful') {
          <path class="line" d="M10 1.4 18.6 10 10 18.6 1.4 10Z" />
          <path d="M10 1.4 18.6 10H1.4Z" />
        }
        @case ('waiting') {
          <circle class="line broken" cx="10" cy="10" r="8.2" />
          <path class="line" d="M10 5.4V10l2.9 2" />
        }
        @case ('hold') {
          <path d="M2 1.5h3v7h10v-7h3v17h-3v-7H5v7H2Z" />
        }
      }
    </svg>
  `,
  styleUrl: './sign.scss',
})
export class Sign {
  readonly name = input.required<SignName>();
}
