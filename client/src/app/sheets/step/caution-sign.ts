import { ChangeDetectionStrategy, Component } from '@angular/core';

/** The drawing-office triangle before a caution. Its words stand beside it. */
@Component({
  selector: 'ss-caution-sign',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { 'aria-hidden': 'true' },
  template: `
    <svg viewBox="0 0 24 22" focusable="false">
      <path
        d="M12 1.8 22.6 20.4H1.4Z"
        fill="none"
        stroke="currentColor"
        stroke-width="1.8"
        stroke-linejoin="round"
      />
      <path d="M12 8v6.2M12 16.4v1.8" stroke="currentColor" stroke-width="1.8" />
    </svg>
  `,
  styles: `
    :host {
      flex: none;
      display: block;
      width: 26px;
      height: 24px;
    }
  `,
})
export class CautionSign {}
