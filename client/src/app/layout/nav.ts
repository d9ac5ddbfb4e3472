import { ChangeDetectionStrategy, Component, computed, inject, output } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { Router, RouterLink, RouterLinkActive } from '@angular/router';
import type { Permission } from '@second-spanner/shared/contracts/permissions';
import { BenchStore } from '../bench/bench-store';
import { SessionStore } from '../session/session-store';
import type { IconName } from './icon-paths';

interface Place {
  readonly name: string;
  readonly icon: IconName;
  readonly link: string;
  readonly permission?: Permission;
}

const places: readonly Place[] = [
  { name: 'Bench', icon: 'bench', link: '/' },
  { name: 'Car files', icon: 'car', link: '/cars', permission: 'cars.read' },
  { name: 'Sheets', icon: 'sheet', link: '/sheets', permission: 'sheets.read' },
  { name: 'Spec book', icon: 'book', link: '/specs', permission: 'specs.read' },
  { name: 'Workings', icon: 'workings', link: '/workings', permission: 'calculate' },
];

/** Where one can go, with what waits on the bench; below it the account and the way out. */
@Component({
  selector: 'ss-nav',
  imports: [MatIcon, RouterLink, RouterLinkActive],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './nav.html',
  styleUrl: './nav.scss',
})
export class Nav {
  private readonly sessions = inject(SessionStore);
  private readonly router = inject(Router);
  private readonly bench = inject(BenchStore);

  /** A place was chosen: a menu around this closes. */
  readonly chosen = output();

  protected readonly waiting = this.bench.count;
  protected readonly demo = computed(() => this.sessions.shop()?.demo ?? false);
  protected readonly person = this.sessions.person;
  protected readonly places = computed(() =>
    places.filter(({ permission }) => permission === undefined || this.sessions.may(permission)),
  );

  protected signOut(): void {
    this.chosen.emit();
    this.sessions.signOut().subscribe({
      next: () => void this.router.navigateByUrl('/sign-in'),
      error: () => void this.router.navigateByUrl('/account'),
    });
  }
}
