import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** One ruled cell of a title block: a caption over a value. */
@Component({
  selector: 'ss-cell',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.figures]': 'figures()', '[class.desk-only]': 'deskOnly()' },
  template: `
    <span class="caption">{{ caption() }}</span>
    <span class="value"><ng-content /></span>
  `,
  styleUrl: './cell.scss',
})
export class Cell {
  readonly caption = input.required<string>();
  /** A code or a figure rather than words. */
  readonly figures = input(false);
  readonly deskOnly = input(false);
}
