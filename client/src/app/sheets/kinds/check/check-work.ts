import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { CheckStep, EntryContent } from '@second-spanner/shared/contracts/steps';
import { Foot } from '../../../foot/foot';
import { VerdictLine } from '../../../verdict/verdict';
import { Correction } from '../../correction/correction';
import { draft, hasTexts } from '../../drafts/draft';
import { SaveLine } from '../../saving/save-line';
import type { ShownStep } from '../../shown-step';
import { StepFrame } from '../../step/step-frame';
import { StepWork } from '../../step-work';

interface CheckDraft {
  readonly outcome: string;
  readonly note: string;
}

const empty: CheckDraft = { outcome: '', note: '' };

/** A check: looked at and found right or wrong, with a note. */
@Component({
  selector: 'ss-check-work',
  imports: [Correction, Foot, MatButton, SaveLine, StepFrame, VerdictLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './check-work.html',
  styleUrl: '../work.scss',
})
export class CheckWork {
  protected readonly work = inject(StepWork);

  readonly step = input.required<ShownStep>();
  readonly definition = input.required<CheckStep>();

  protected readonly typed = draft(
    () => this.work.draftKey('check'),
    empty,
    (value): value is CheckDraft => hasTexts(value, ['outcome', 'note']),
  );
  protected readonly isEntering = computed(() => this.work.isOpen() && this.work.slot() !== null);
  protected readonly result = computed(() => {
    const entry = this.step().entries.findLast(({ current }) => current);
    return entry === undefined ? null : { verdict: entry.verdict, reason: entry.reason };
  });

  protected choose(outcome: 'pass' | 'fail'): void {
    this.typed.update((typed) => ({ ...typed, outcome }));
  }

  protected note(note: string): void {
    this.typed.update((typed) => ({ ...typed, note }));
  }

  protected async keep(): Promise<void> {
    const { outcome, note } = this.typed();
    if (outcome !== 'pass' && outcome !== 'fail') return;
    const content: EntryContent = {
      kind: 'check',
      outcome,
      note: note.trim() === '' ? undefined : note.trim(),
    };
    if (await this.work.record(this.definition(), content)) this.typed.set(empty);
  }
}
