import { DOCUMENT } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
  untracked,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { begunFrom, type WorkingCase } from '@second-spanner/shared/workings/working';
import { saveFile } from '../../http/save-file';
import { SessionStore } from '../../session/session-store';
import { Saving } from '../../sheets/saving/save-state';
import { ProblemLine } from '../../states/problem-line';
import { WorkingsApi, type Paper } from '../workings-api';
import { KeepInCar } from './keep-in-car';

/** What may be done with an answer: printed, copied, made a PDF, kept with a car. */
@Component({
  selector: 'ss-working-acts',
  imports: [KeepInCar, MatButton, ProblemLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './working-acts.html',
  styleUrl: './working-acts.scss',
})
export class WorkingActs {
  private readonly document = inject(DOCUMENT);
  private readonly api = inject(WorkingsApi);
  protected readonly mayKeep = inject(SessionStore).may('workings.keep');

  /** The working's key. */
  readonly working = input.required<string>();
  readonly title = input.required<string>();
  readonly typed = input.required<WorkingCase>();
  /** The whole answer as plain text, made when it is asked for. */
  readonly text = input.required<() => string>();

  /** The name that a kept copy is offered. */
  protected readonly keptTitle = computed(() => {
    const begun = this.typed()[begunFrom] ?? '';
    return begun === '' ? this.title() : `${this.title()}, ${begun}`;
  });
  protected readonly copied = signal<'yes' | 'by-hand' | null>(null);
  protected readonly paper = signal<Paper>('a4');
  protected readonly reading = new Saving();

  constructor() {
    // Of another case nothing has been copied yet.
    effect(() => {
      this.typed();
      untracked(() => this.copied.set(null));
    });
  }

  protected print(): void {
    this.document.defaultView?.print();
  }

  protected async copy(): Promise<void> {
    try {
      await this.document.defaultView?.navigator.clipboard.writeText(this.text()());
      this.copied.set('yes');
    } catch {
      this.copied.set('by-hand');
    }
  }

  protected choosePaper(name: string): void {
    this.paper.set(name === 'letter' ? 'letter' : 'a4');
  }

  protected async makePdf(): Promise<void> {
    const pdf = await this.reading.follow(this.api.pdf(this.working(), this.typed(), this.paper()));
    if (pdf !== null) saveFile(this.document, pdf.file, pdf.name);
  }
}
