import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { dialects, type Dialect } from '@second-spanner/shared/contracts/people';
import { toApiProblem, type ApiProblem } from '../http/api-problem';
import { Cell } from '../layout/cell';
import { Light, lights, type LightName } from '../layout/light';
import { TitleBlock } from '../layout/title-block';
import { WaitingList } from '../offline/waiting-list';
import { OwnKeypad } from '../reading/own-keypad';
import { SessionStore } from '../session/session-store';
import { ProblemLine } from '../states/problem-line';
import { roleNames } from '../words/names';
import { Choice } from './choice';

const dialectNames: Readonly<Record<Dialect, string>> = {
  british: 'British: clearance, sump, spanner',
  american: 'American: lash, oil pan, wrench',
};
const lightNames: Readonly<Record<LightName, string>> = { day: 'Day', lamp: 'Lamp' };

/** Who one is here, and how the pages should read, shine and be typed on. */
@Component({
  selector: 'ss-account',
  imports: [Cell, Choice, MatButton, ProblemLine, TitleBlock, WaitingList],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './account.html',
  styleUrl: './account.scss',
})
export class AccountPage {
  private readonly sessions = inject(SessionStore);
  private readonly lights = inject(Light);
  private readonly keypads = inject(OwnKeypad);
  private readonly router = inject(Router);

  protected readonly person = this.sessions.person;
  protected readonly shop = this.sessions.shop;
  protected readonly role = computed(() => {
    const person = this.person();
    return person === null ? '' : roleNames[person.role];
  });

  protected readonly dialect = computed(() => this.person()?.dialect ?? 'shop');
  protected readonly dialectChoices = computed(() => [
    { value: 'shop', name: `As the shop: ${this.shop()?.dialect === 'american' ? 'American' : 'British'}` },
    ...dialects.map((dialect) => ({ value: dialect, name: dialectNames[dialect] })),
  ]);
  protected readonly light = this.lights.light;
  protected readonly lightChoices = lights.map((light) => ({ value: light, name: lightNames[light] }));
  protected readonly keypad = computed(() => (this.keypads.isOwn() ? 'own' : 'device'));
  protected readonly keypadChoices = [
    { value: 'own', name: 'The stand’s own keypad' },
    { value: 'device', name: 'The device’s keyboard' },
  ];
  protected readonly saved = signal('');
  protected readonly problem = signal<ApiProblem | null>(null);

  protected chooseDialect(value: string): void {
    this.problem.set(null);
    this.saved.set('Saving…');
    this.sessions.prefer(dialects.find((dialect) => dialect === value) ?? null).subscribe({
      next: () => this.saved.set('Saved.'),
      error: (error: unknown) => {
        this.saved.set('');
        this.problem.set(toApiProblem(error));
      },
    });
  }

  protected chooseLight(value: string): void {
    this.lights.choose(value === 'lamp' ? 'lamp' : 'day');
  }

  protected chooseKeypad(value: string): void {
    this.keypads.choose(value === 'own');
  }

  protected signOut(): void {
    this.problem.set(null);
    this.sessions.signOut().subscribe({
      next: () => void this.router.navigateByUrl('/sign-in'),
      error: (error: unknown) => this.problem.set(toApiProblem(error)),
    });
  }
}
