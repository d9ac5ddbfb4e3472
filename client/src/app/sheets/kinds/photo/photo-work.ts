import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { PhotoStep } from '@second-spanner/shared/contracts/steps';
import { Foot } from '../../../foot/foot';
import { Sentence } from '../../../quantity/sentence';
import { Sign } from '../../../verdict/sign';
import { Correction } from '../../correction/correction';
import type { FilledSlot } from '../../next-slot';
import { SaveLine } from '../../saving/save-line';
import type { ShownStep } from '../../shown-step';
import { StepFrame } from '../../step/step-frame';
import { StepWork } from '../../step-work';
import { PhotoOnDevice } from './photo-on-device';

/** Photos of what the step names, one of each: taken here, kept on the device first, then sent. */
@Component({
  selector: 'ss-photo-work',
  imports: [Correction, Foot, MatButton, MatIcon, PhotoOnDevice, SaveLine, Sentence, Sign, StepFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './photo-work.html',
  styleUrls: ['../work.scss', './photo-work.scss'],
})
export class PhotoWork {
  protected readonly work = inject(StepWork);

  readonly step = input.required<ShownStep>();
  readonly definition = input.required<PhotoStep>();

  protected readonly isTaking = computed(() => this.work.isOpen() && this.work.slot() !== null);
  protected readonly slots = computed(() =>
    this.work
      .slots()
      .map((slot) => ({ ...slot, fileId: fileOf(slot), isHere: slot.key === this.work.slot()?.key })),
  );
  protected readonly wrong = signal<string | null>(null);

  protected async take(input: HTMLInputElement): Promise<void> {
    const [photo] = input.files ?? [];
    const slot = this.work.slot();
    if (photo === undefined || slot === null) return;
    this.wrong.set(photo.type.startsWith('image/') ? null : 'This is no picture: take or choose a photo.');
    if (this.wrong() === null) {
      await this.work.record(this.definition(), { kind: 'photo', shows: slot.label, fileId: '' }, photo);
    }
    input.value = '';
  }
}

function fileOf({ entry }: FilledSlot): string | null {
  return entry?.content.kind === 'photo' && entry.content.fileId !== '' ? entry.content.fileId : null;
}
