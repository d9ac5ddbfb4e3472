import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatInput, MatLabel } from '@angular/material/input';
import { Router } from '@angular/router';
import type { ApiProblem } from '../http/api-problem';
import { toApiProblem } from '../http/api-problem';
import { Mark } from '../layout/mark';
import { SessionStore } from '../session/session-store';
import { ProblemLine } from '../states/problem-line';

/** Who is at the bench. Afterwards the person is where they wanted to go. */
@Component({
  selector: 'ss-sign-in',
  imports: [Mark, MatButton, MatError, MatFormField, MatInput, MatLabel, ProblemLine, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sign-in.html',
  styleUrl: './sign-in.scss',
})
export class SignIn {
  private readonly sessions = inject(SessionStore);
  private readonly router = inject(Router);

  /** The address to go to afterwards, from the query. */
  readonly to = input<string>();

  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly isSigningIn = signal(false);
  protected readonly form = new FormGroup({
    email: new FormControl('', { nonNullable: true, validators: [Validators.required, Validators.email] }),
    password: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
  });

  protected signIn(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.isSigningIn()) return;
    this.problem.set(null);
    this.isSigningIn.set(true);
    this.sessions.signIn(this.form.getRawValue()).subscribe({
      next: () => void this.router.navigateByUrl(ownAddress(this.to())),
      error: (error: unknown) => {
        this.isSigningIn.set(false);
        this.problem.set(toApiProblem(error));
      },
    });
  }
}

/** Only addresses of our own are gone to. */
function ownAddress(to: string | undefined): string {
  return to !== undefined && /^\/(?![/\\])/.test(to) ? to : '/';
}
