import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  signal,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { toApiProblem, type ApiProblem } from '../http/api-problem';
import { Mark } from '../layout/mark';
import { SessionStore } from '../session/session-store';
import { ProblemLine } from '../states/problem-line';
import { Sign } from '../verdict/sign';
import { ownAddress } from './own-address';

/**
 * Who is at the bench; afterwards the person is where they wanted to go. Plain fields: this is the first
 * page that is downloaded, and it needs no more.
 */
@Component({
  selector: 'ss-sign-in',
  imports: [Mark, MatButton, ProblemLine, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sign-in.html',
  styleUrl: './sign-in.scss',
})
export class SignIn {
  private readonly sessions = inject(SessionStore);
  private readonly router = inject(Router);

  /** The address to go to afterwards, from the query. */
  readonly to = input<string>();

  private readonly emailField = viewChild.required<ElementRef<HTMLInputElement>>('emailField');
  private readonly passwordField = viewChild.required<ElementRef<HTMLInputElement>>('passwordField');
  protected readonly email = signal('');
  protected readonly password = signal('');
  private readonly isTried = signal(false);
  protected readonly isSigningIn = signal(false);
  protected readonly problem = signal<ApiProblem | null>(null);

  protected readonly emailError = computed(() =>
    this.isTried() && !/^\S+@\S+$/.test(this.email().trim())
      ? 'Write your e-mail address, such as name@example.com.'
      : null,
  );
  protected readonly passwordError = computed(() =>
    this.isTried() && this.password() === '' ? 'Write your password.' : null,
  );

  protected signIn(event: Event): void {
    event.preventDefault();
    this.isTried.set(true);
    if (this.emailError() !== null) return this.emailField().nativeElement.focus();
    if (this.passwordError() !== null) return this.passwordField().nativeElement.focus();
    if (this.isSigningIn()) return;
    this.problem.set(null);
    this.isSigningIn.set(true);
    this.sessions.signIn({ email: this.email().trim(), password: this.password() }).subscribe({
      next: () => void this.router.navigateByUrl(ownAddress(this.to())),
      error: (error: unknown) => {
        this.isSigningIn.set(false);
        this.problem.set(toApiProblem(error));
      },
    });
  }
}
