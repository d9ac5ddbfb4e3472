import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import type { WorkingAnswer } from '@second-spanner/shared/workings/working';
import { judgementWord } from '@second-spanner/shared/workings/judgement-words';
import { debounceTime, skip } from 'rxjs';
import { SessionStore } from '../../session/session-store';

/** How long nothing was typed before the answer is read out: not at every key. */
const pause = 900;

/** The answer in short, for those who hear the page. */
@Component({
  selector: 'ss-spoken',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'status', class: 'visually-hidden' },
  template: '{{ aloud() }}',
})
export class Spoken {
  private readonly dialect = inject(SessionStore).dialect;

  readonly answer = input.required<WorkingAnswer>();

  private readonly words = computed(() => tradeText(inShort(this.answer()), this.dialect()));
  protected readonly aloud = toSignal(toObservable(this.words).pipe(skip(1), debounceTime(pause)), {
    initialValue: '',
  });
}

/** The first judgement, else the first figure, else what is still missing. */
export function inShort({ parts, missing, errors }: WorkingAnswer): string {
  const judgement = parts.find((part) => part.kind === 'judgement');
  if (judgement !== undefined) {
    return `${judgementWord(judgement)}: ${judgement.reason}`;
  }
  const fact = parts.find((part) => part.kind === 'facts')?.facts[0];
  if (fact !== undefined) return `${fact.name}: ${fact.value}`;
  if (parts.length > 0) return 'Worked out.';
  return Object.keys(errors).length > 0 ? 'Something typed is to be put right.' : (missing ?? '');
}
