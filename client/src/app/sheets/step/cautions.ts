import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Sentence } from '../../quantity/sentence';
import { recall, remember } from '../../remembered/remembered';
import { SessionStore } from '../../session/session-store';
import { SheetStore } from '../sheet-store';
import { CautionSign } from './caution-sign';

/** A stage's cautions above its steps: open until this person has read them on this sheet, then a line to open. */
@Component({
  selector: 'ss-cautions',
  imports: [CautionSign, MatButton, Sentence],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (cautions().length > 0) {
      @if (isRead()) {
        <details>
          <summary><ss-caution-sign />Cautions of stage {{ stage() }}, read</summary>
          <ul>
            @for (caution of cautions(); track caution) {
              <li><ss-sentence [text]="caution" /></li>
            }
          </ul>
        </details>
      } @else {
        <section [attr.aria-label]="'Cautions of stage ' + stage()">
          <ss-caution-sign />
          <div>
            <h2>Take care</h2>
            <ul>
              @for (caution of cautions(); track caution) {
                <li><ss-sentence [text]="caution" /></li>
              }
            </ul>
            <button matButton="outlined" type="button" (click)="acknowledge()">I have read it</button>
          </div>
        </section>
      }
    }
  `,
  styleUrl: './cautions.scss',
})
export class Cautions {
  private readonly store = inject(SheetStore);
  private readonly sessions = inject(SessionStore);

  readonly stage = input.required<number>();

  protected readonly cautions = computed(
    () => this.store.stages().find(({ stage }) => stage === this.stage())?.cautions ?? [],
  );
  private readonly name = computed(() => `cautions.${this.sessions.person()?.id ?? ''}.${this.store.id()}`);
  /** Rises when something was read, as the device's memory tells nobody of it. */
  private readonly readings = signal(0);
  protected readonly isRead = computed(() => {
    this.readings();
    return this.read().includes(String(this.stage()));
  });

  protected acknowledge(): void {
    remember(this.name(), [...this.read(), this.stage()].join(','));
    this.readings.update((count) => count + 1);
  }

  private read(): readonly string[] {
    return (recall(this.name()) ?? '').split(',').filter(Boolean);
  }
}
