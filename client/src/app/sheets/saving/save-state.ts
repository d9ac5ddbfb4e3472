import { signal } from '@angular/core';
import { firstValueFrom, type Observable } from 'rxjs';
import { toApiProblem, type ApiProblem } from '../../http/api-problem';

/** Where a save stands; every one of them is told on the page. */
export type SaveState =
  | { readonly state: 'none' }
  | { readonly state: 'saving' }
  | { readonly state: 'kept'; readonly at: string }
  | { readonly state: 'waiting' }
  | { readonly state: 'failed'; readonly problem: ApiProblem };

/** One save, or one after the other. */
export class Saving {
  private readonly standing = signal<SaveState>({ state: 'none' });

  readonly state = this.standing.asReadonly();

  get isUnderWay(): boolean {
    return this.standing().state === 'saving';
  }

  get problem(): ApiProblem | null {
    const standing = this.standing();
    return standing.state === 'failed' ? standing.problem : null;
  }

  set(state: SaveState): void {
    this.standing.set(state);
  }

  kept(): void {
    this.standing.set({ state: 'kept', at: new Date().toISOString() });
  }

  /** Follows a request: the answer, or null where it failed and the state now says why. */
  async follow<T>(request: Observable<T>): Promise<T | null> {
    if (this.isUnderWay) return null;
    this.standing.set({ state: 'saving' });
    try {
      const answer = await firstValueFrom(request);
      this.kept();
      return answer;
    } catch (error) {
      this.standing.set({ state: 'failed', problem: toApiProblem(error) });
      return null;
    }
  }
}
