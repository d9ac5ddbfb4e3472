import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { SignatureMeaning } from '@second-spanner/shared/contracts/sheets';
import { Network } from '../../http/network';
import { SaveLine } from '../saving/save-line';
import { Saving } from '../saving/save-state';
import { SessionStore } from '../../session/session-store';
import { Sign } from '../../verdict/sign';
import { SheetApi } from '../sheet-api';
import { SheetStore } from '../sheet-store';

const acts: Record<
  SignatureMeaning,
  { readonly heading: string; readonly says: string; readonly act: string }
> = {
  built: {
    heading: 'Sign as the builder',
    says: 'I built this engine to this sheet, and every entry on it is true.',
    act: 'Sign as the builder',
  },
  countersigned: {
    heading: 'Sign as the second person',
    says: 'I checked the critical steps of this sheet myself, and they are as recorded.',
    act: 'Sign as the second person',
  },
  released: {
    heading: 'Release the sheet',
    says: 'This sheet is complete. From now on it is frozen; nothing on it can be changed.',
    act: 'Release the sheet',
  },
};

/** A signature: what it says, the password once more, and the act. Never kept for later: it needs the network. */
@Component({
  selector: 'ss-sign-form',
  imports: [MatButton, SaveLine, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form aria-labelledby="sign-heading" (submit)="sign($event)">
      <h2 id="sign-heading">{{ words().heading }}</h2>
      <p>{{ words().says }}</p>
      <!-- For password managers, which want a name beside the password. -->
      <input
        class="visually-hidden"
        type="text"
        autocomplete="username"
        tabindex="-1"
        aria-hidden="true"
        readonly
        [value]="email()"
      />
      <label for="sign-password">Your password, once more</label>
      <input
        #secret
        id="sign-password"
        type="password"
        autocomplete="current-password"
        [value]="password()"
        [attr.aria-invalid]="error() !== null"
        [attr.aria-describedby]="error() === null ? null : 'sign-password-error'"
        (input)="password.set(secret.value)"
      />
      @if (error(); as sentence) {
        <p id="sign-password-error" class="small error" role="alert"><ss-sign name="fail" />{{ sentence }}</p>
      } @else {
        <ss-save-line [of]="saving.state()" />
      }
      @if (!reachable()) {
        <p class="small error">
          <ss-sign name="waiting" />Signing needs the network: a signature is never kept for later.
        </p>
      }
      <button
        matButton="filled"
        type="submit"
        [disabled]="password() === '' || !reachable() || saving.state().state === 'saving'"
      >
        {{ words().act }}
      </button>
    </form>
  `,
  styleUrl: './sign-form.scss',
})
export class SignForm {
  private readonly api = inject(SheetApi);
  private readonly store = inject(SheetStore);
  private readonly sessions = inject(SessionStore);

  readonly meaning = input.required<SignatureMeaning>();

  protected readonly saving = new Saving();
  protected readonly password = signal('');
  protected readonly reachable = inject(Network).reachable;
  protected readonly email = computed(() => this.sessions.person()?.email ?? '');
  protected readonly words = computed(() => acts[this.meaning()]);
  protected readonly error = computed(() => {
    const standing = this.saving.state();
    return standing.state === 'failed' ? standing.problem.errorAt('password') : null;
  });

  protected async sign(event: Event): Promise<void> {
    event.preventDefault();
    if (this.password() === '') return;
    const request = { meaning: this.meaning(), password: this.password() };
    const sheet = await this.saving.follow(this.api.sign(this.store.id(), request));
    if (sheet === null) return;
    this.password.set('');
    this.store.takeSheet(sheet);
  }
}
