import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Sentence } from '../../quantity/sentence';
import { Sign } from '../../verdict/sign';
import { SheetStore } from '../sheet-store';
import type { ShownStep } from '../shown-step';
import { stateSentence } from './state-sentence';

/** What a step waits for and for whom, with the way there; and why a sheet takes nothing at all. */
@Component({
  selector: 'ss-waits',
  imports: [RouterLink, Sentence, Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (sentences().length > 0) {
      <ul>
        @for (wait of sentences(); track wait.sentence) {
          <li>
            <ss-sign [name]="wait.what === 'hold' ? 'hold' : wait.what === 'snag' ? 'fail' : 'waiting'" />
            <span>
              <ss-sentence [text]="wait.sentence" />
              @if (wait.code; as code) {
                @if (code !== step().code) {
                  <a [routerLink]="['/sheets', store.id(), 'steps', code]">Go to {{ code }}</a>
                }
              }
            </span>
          </li>
        }
      </ul>
    }
  `,
  styles: `
    ul {
      padding: var(--ss-2) var(--ss-4);
      background: var(--ss-wait-wash);
      border: var(--ss-hair) solid var(--ss-thin);
    }

    li {
      display: flex;
      gap: var(--ss-3);
      padding: var(--ss-1) 0;
    }

    ss-sign {
      margin-top: 2px;
    }

    a {
      display: inline-block;
      padding: var(--ss-1) var(--ss-1);
      font-weight: 500;
      white-space: nowrap;
    }
  `,
})
export class Waits {
  protected readonly store = inject(SheetStore);

  readonly step = input.required<ShownStep>();

  protected readonly sentences = computed(() => {
    const state = this.store.sheet.hasValue() ? this.store.sheet.value().state : 'on-the-stand';
    const ofSheet = stateSentence(state);
    const waits = this.step().waitsFor.filter(({ what }) => what !== 'sheet');
    return [
      ...(ofSheet === null ? [] : [{ what: 'sheet' as const, code: undefined, sentence: ofSheet }]),
      ...waits,
    ];
  });
}
