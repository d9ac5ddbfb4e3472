import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { settlements, type Settlement, type SnagView } from '@second-spanner/shared/contracts/sheets';
import { draft } from '../drafts/draft';
import { SaveLine } from '../saving/save-line';
import { Saving } from '../saving/save-state';
import { SessionStore } from '../../session/session-store';
import { Sign } from '../../verdict/sign';
import { settlementWords } from '../settlement-words';
import { SheetApi } from '../sheet-api';
import { SheetStore } from '../sheet-store';

const isText = (value: unknown): value is string => typeof value === 'string';

/** How a snag is settled, and why. Accepting something as it is belongs to the foreman alone. */
@Component({
  selector: 'ss-settle-form',
  imports: [MatButton, SaveLine, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './settle-form.html',
  styleUrl: './settle-form.scss',
})
export class SettleForm {
  private readonly api = inject(SheetApi);
  private readonly store = inject(SheetStore);
  private readonly sessions = inject(SessionStore);

  readonly snag = input.required<SnagView>();

  protected readonly saving = new Saving();
  protected readonly words = settlementWords;
  protected readonly how = signal<Settlement | null>(null);
  protected readonly reason = draft(() => `${this.store.id()}/settle/${this.snag().id}`, '', isText);
  protected readonly choices = computed(() =>
    settlements.filter((how) => how !== 'accepted-as-it-is' || this.sessions.may('snags.accept')),
  );
  protected readonly isWhole = computed(() => this.how() !== null && this.reason().trim() !== '');
  protected readonly error = computed(() => {
    const standing = this.saving.state();
    return standing.state === 'failed' ? standing.problem.errorAt('reason') : null;
  });

  protected async settle(event: Event): Promise<void> {
    event.preventDefault();
    const how = this.how();
    if (how === null || !this.isWhole()) return;
    const request = { how, reason: this.reason().trim() };
    const step = await this.saving.follow(this.api.settleSnag(this.store.id(), this.snag().id, request));
    if (step === null) return;
    this.reason.set('');
    this.store.take(step);
  }
}
