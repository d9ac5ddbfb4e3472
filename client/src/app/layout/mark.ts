import { ChangeDetectionStrategy, Component } from '@angular/core';

/** The two spanners: first and second reading. Decoration beside the name; alone, give its link a label. */
@Component({
  selector: 'ss-mark',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { 'aria-hidden': 'true' },
  template: `
    <svg viewBox="0 0 24 24" focusable="false">
      <path
        transform="translate(6.1 5.1)"
        fill="var(--ss-blue)"
        d="M-0.89,-4.62L-1.92,-0.77L-0.36,1.34L2.04,0.29L3.07,-3.55A4.7 4.7 0 0 1 1.75 4.36L1.75 16.45A1.75 1.75 0 0 1 -1.75 16.45L-1.75 4.36A4.7 4.7 0 0 1 -0.89,-4.62Z"
      />
      <path
        transform="translate(17.6 5.1)"
        fill="none"
        stroke="var(--ss-blue)"
        stroke-width="1.25"
        stroke-linejoin="round"
        d="M-0.95,-3.99L-1.83,-0.69L-0.35,1.32L1.93,0.32L2.82,-2.98A4.1 4.1 0 0 1 1.25 3.9L1.25 16.35A1.25 1.25 0 0 1 -1.25 16.35L-1.25 3.9A4.1 4.1 0 0 1 -0.95,-3.99Z"
      />
    </svg>
  `,
  styles: `
    :host {
      display: inline-flex;
      width: 32px;
      height: 36px;
    }

    svg {
      width: 100%;
      height: 100%;
    }
  `,
})
export class Mark {}
