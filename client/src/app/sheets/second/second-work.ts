import { computed, inject, Injectable } from '@angular/core';
import type { SecondReadingView, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { SecondReadingContent } from '@second-spanner/shared/contracts/steps';
import type { Observable } from 'rxjs';
import { KeyFor } from '../../offline/new-key';
import { SessionStore } from '../../session/session-store';
import { Saving } from '../saving/save-state';
import { SheetApi } from '../sheet-api';
import { SheetStore } from '../sheet-store';

/** The second person's acts on one step. They need the network: a reading that is not in could not uncover the first. */
@Injectable()
export class SecondWork {
  private readonly api = inject(SheetApi);
  private readonly store = inject(SheetStore);
  private readonly sessions = inject(SessionStore);
  private readonly readingKey = new KeyFor();
  private readonly signingKey = new KeyFor();

  readonly saving = new Saving();
  readonly disputing = new Saving();
  readonly cannot = new Saving();

  private readonly step = this.store.step;
  /** The person's own second reading in the step's present round. */
  readonly own = computed<SecondReadingView | null>(() => {
    const step = this.step();
    const id = this.sessions.person()?.id;
    return step?.secondReadings.findLast(({ by, round }) => by.id === id && round === step.round) ?? null;
  });
  readonly countersigned = computed(() => {
    const step = this.step();
    return (
      step?.countersignatures.findLast(({ round, outcome }) => round === step.round && outcome === 'agree') ??
      null
    );
  });

  draftKey(part: string): string {
    return `${this.store.id()}/${this.store.code() ?? ''}/second-${part}`;
  }

  /** Something is changed: what was said of it before no longer counts. */
  touched(): void {
    this.saving.set({ state: 'none' });
  }

  errorAt(field: string): string | null {
    const standing = this.saving.state();
    return standing.state === 'failed' ? standing.problem.errorAt(field) : null;
  }

  keepReading(content: SecondReadingContent): Promise<boolean> {
    return this.act(this.saving, ({ sheetId, code }) =>
      this.api.readAgain(sheetId, code, { content }, this.readingKey.of(content)),
    );
  }

  countersign(pullsWitnessed: readonly string[] | null): Promise<boolean> {
    const request =
      pullsWitnessed === null ? { outcome: 'agree' as const } : { outcome: 'agree' as const, pullsWitnessed };
    return this.act(this.saving, ({ sheetId, code }) =>
      this.api.countersign(sheetId, code, request, this.signingKey.of(request)),
    );
  }

  dispute(reason: string): Promise<boolean> {
    const request = { outcome: 'dispute' as const, reason };
    return this.act(this.disputing, ({ sheetId, code }) =>
      this.api.countersign(sheetId, code, request, this.signingKey.of(request)),
    );
  }

  sayCannot(words: string): Promise<boolean> {
    return this.act(this.cannot, ({ sheetId, code }) => this.api.raiseSnag(sheetId, code, { words }));
  }

  private async act(
    saving: Saving,
    request: (step: Pick<StepDetail, 'sheetId' | 'code'>) => Observable<StepDetail>,
  ): Promise<boolean> {
    const step = this.step();
    const answer = step === null ? null : await saving.follow(request(step));
    if (answer !== null) this.store.take(answer);
    return answer !== null;
  }
}
