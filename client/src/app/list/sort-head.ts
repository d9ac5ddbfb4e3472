import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatIcon } from '@angular/material/icon';

/** A table head that sorts by its column: `<th ssSortHead column="name" [sort]="…" (sorted)="…">Name</th>`. */
@Component({
  selector: 'th[ssSortHead]',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { scope: 'col', '[attr.aria-sort]': 'order()' },
  template: `
    <button type="button" (click)="turn()">
      <ng-content />
      @if (order(); as way) {
        <mat-icon [svgIcon]="way === 'ascending' ? 'up' : 'descend'" />
      }
    </button>
  `,
  styles: `
    button {
      display: inline-flex;
      align-items: center;
      gap: 2px;
      min-height: 24px;
      padding: 0;
      font: inherit;
      color: inherit;
      background: none;
      border: 0;
      cursor: pointer;

      &:hover {
        color: var(--ss-blue);
      }
    }

    mat-icon {
      width: 14px;
      height: 14px;
      color: var(--ss-blue);
    }
  `,
})
export class SortHead {
  readonly column = input.required<string>();
  /** The list's present order, as in its address. */
  readonly sort = input.required<string>();
  readonly sorted = output<string>();

  protected readonly order = computed(() => {
    if (this.sort() === this.column()) return 'ascending';
    return this.sort() === `-${this.column()}` ? 'descending' : null;
  });

  protected turn(): void {
    this.sorted.emit(this.order() === 'ascending' ? `-${this.column()}` : this.column());
  }
}
