import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { NavigationEnd, NavigationError, Router } from '@angular/router';
import { Sign } from '../verdict/sign';

/** Over whatever is shown: that a page could not be downloaded, with another try. */
@Component({
  selector: 'ss-page-failed',
  imports: [MatButton, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (address(); as address) {
      <div class="sheet screen-only">
        <div class="state" role="alert">
          <ss-sign name="waiting" />
          <div>
            <h2>The page could not be opened</h2>
            <p>It has not been opened on this device before, and there is no network to fetch it by.</p>
            <button matButton="outlined" type="button" (click)="open(address)">Try again</button>
          </div>
        </div>
      </div>
    }
  `,
  styleUrl: './states.scss',
})
export class PageFailed {
  private readonly router = inject(Router);

  /** Of the page that failed. */
  protected readonly address = signal<string | null>(null);

  constructor() {
    this.router.events.pipe(takeUntilDestroyed()).subscribe((event) => {
      if (event instanceof NavigationError) this.address.set(event.url);
      if (event instanceof NavigationEnd) this.address.set(null);
    });
  }

  protected open(address: string): void {
    // A page that fails once more is told of by its event.
    void this.router.navigateByUrl(address).catch(() => false);
  }
}
