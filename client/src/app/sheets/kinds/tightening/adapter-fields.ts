import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import { InputError } from '@second-spanner/shared/contracts/input-error';
import type { Adapter } from '@second-spanner/shared/contracts/steps';
import { parseQuantity } from '@second-spanner/shared/quantities/parse';
import { kindOf } from '@second-spanner/shared/quantities/convert';
import { Sign } from '../../../verdict/sign';

/** An adapter as it is typed. */
export interface AdapterDraft {
  readonly isOn: boolean;
  readonly length: string;
  readonly angle: string;
}

export const noAdapter: AdapterDraft = { isOn: false, length: '', angle: '0' };

export interface AdapterRead {
  readonly adapter: Adapter | undefined;
  /** Whether what is typed can be used; without an adapter it can. */
  readonly isWhole: boolean;
  readonly lengthError: string | null;
  readonly angleError: string | null;
}

/** Reads the adapter's fields; a bare length is in millimetres. */
export function readAdapter({ isOn, length, angle }: AdapterDraft): AdapterRead {
  if (!isOn) return { adapter: undefined, isWhole: true, lengthError: null, angleError: null };
  const degrees = Number(angle.trim().replace(',', '.').replace('−', '-').replace('°', ''));
  const angleError =
    angle.trim() === '' || !Number.isFinite(degrees) || Math.abs(degrees) > 360
      ? 'Give the angle in degrees, 0 where the adapter points straight on.'
      : null;
  if (length.trim() === '') return { adapter: undefined, isWhole: false, lengthError: null, angleError };
  try {
    const quantity = parseQuantity(length, 'mm', 'length');
    const isLength = kindOf(quantity.unit) === 'length' && quantity.value > 0;
    if (!isLength) throw new InputError('length', 'This must be a length, such as 60 mm.');
    const adapter = angleError === null ? { length: quantity, angle: degrees } : undefined;
    return { adapter, isWhole: adapter !== undefined, lengthError: null, angleError };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return { adapter: undefined, isWhole: false, lengthError: error.message, angleError };
  }
}

/** An adapter or crow-foot on the wrench: how far it reaches, and at what angle. */
@Component({
  selector: 'ss-adapter-fields',
  imports: [Sign],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label class="on">
      <input #on type="checkbox" [checked]="typed().isOn" (change)="change({ isOn: on.checked })" />
      With an adapter or crow-foot
    </label>
    @if (typed().isOn) {
      <div class="fields">
        <label>
          <span>Reach, square to {{ noun() }}</span>
          <input
            #reach
            type="text"
            inputmode="decimal"
            placeholder="60 mm"
            autocomplete="off"
            [value]="typed().length"
            [attr.aria-invalid]="read().lengthError !== null"
            (input)="change({ length: reach.value })"
          />
        </label>
        <label>
          <span>Angle to the wrench, °</span>
          <input
            #turn
            type="text"
            inputmode="decimal"
            autocomplete="off"
            [value]="typed().angle"
            [attr.aria-invalid]="read().angleError !== null"
            (input)="change({ angle: turn.value })"
          />
        </label>
      </div>
      @for (sentence of sentences(); track sentence) {
        <p class="small error" role="alert"><ss-sign name="fail" />{{ sentence }}</p>
      }
    }
  `,
  styleUrl: './adapter-fields.scss',
})
export class AdapterFields {
  readonly typed = model.required<AdapterDraft>();
  readonly noun = input.required<string>();
  /** What the page found with these in the sum. */
  readonly error = input<string | null>(null);

  protected readonly read = computed(() => readAdapter(this.typed()));
  protected readonly sentences = computed(() =>
    [this.read().lengthError, this.read().angleError, this.error()].filter((sentence) => sentence !== null),
  );

  protected change(part: Partial<AdapterDraft>): void {
    this.typed.update((typed) => ({ ...typed, ...part }));
  }
}
