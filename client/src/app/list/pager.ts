import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';

/** Which page of how many, and the way to the others. Nothing where one page holds all. */
@Component({
  selector: 'ss-pager',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (pages() > 1) {
      <nav [attr.aria-label]="label()">
        <button matButton type="button" [disabled]="page() === 1" (click)="turned.emit(page() - 1)">
          Page before
        </button>
        <span class="small">
          Page <span class="f">{{ page() }}</span> of <span class="f">{{ pages() }}</span>
        </span>
        <button matButton type="button" [disabled]="page() === pages()" (click)="turned.emit(page() + 1)">
          Next page
        </button>
      </nav>
    }
  `,
  styles: `
    nav {
      display: flex;
      align-items: center;
      justify-content: space-between;
      gap: var(--ss-2);
      padding-top: var(--ss-3);
    }

    @media (min-width: 960px) {
      nav {
        justify-content: flex-end;
      }
    }
  `,
})
export class Pager {
  readonly page = input.required<number>();
  readonly pages = input.required<number>();
  readonly label = input('Pages');
  readonly turned = output<number>();
}
