import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { FormPost } from '@second-spanner/shared/workings/wiring-map/cap-of-form';
import {
  valveFields,
  type FormErrors,
  type WiringForm,
} from '@second-spanner/shared/workings/wiring-map/wiring-form';
import { ChosenField, type Choice } from '../../fields/chosen-field';
import { TraceFields } from './trace-fields';
import { TypedField } from '../../fields/typed-field';

const valveLabels: Readonly<Record<(typeof valveFields)[number], string>> = {
  ivo: '{Inlet} opens, before TDC',
  ivc: '{Inlet} closes, after BDC',
  evo: 'Exhaust opens, before BDC',
  evc: 'Exhaust closes, after TDC',
};

/** What the engine has: cylinders, order, rotor, posts and outlets, and the timing that the sparks are judged by. */
@Component({
  selector: 'ss-engine-fields',
  imports: [ChosenField, TraceFields, TypedField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './engine-fields.html',
  styleUrl: './engine-fields.scss',
})
export class EngineFields {
  readonly form = input.required<WiringForm>();
  readonly errors = input.required<FormErrors>();
  readonly posts = input.required<readonly FormPost[]>();
  readonly outlets = input.required<readonly string[]>();
  readonly changed = output<Partial<WiringForm>>();

  protected readonly directions: readonly Choice[] = [
    { value: 'clockwise', words: 'clockwise' },
    { value: 'anticlockwise', words: '{anticlockwise}' },
  ];
  protected readonly sides: readonly Choice[] = [
    { value: 'cap', words: 'the cap, from above' },
    { value: 'drive', words: 'the drive, from below' },
  ];
  protected readonly spacings: readonly Choice[] = [
    { value: 'even', words: 'evenly spaced' },
    { value: 'typed', words: 'at angles of their own' },
  ];
  protected readonly outletWays: readonly Choice[] = [
    { value: 'own', words: 'each post its own' },
    { value: 'traced', words: 'traced inside the cap' },
  ];
  protected readonly firstPosts = computed<readonly Choice[]>(() =>
    this.posts().map(({ key }) => ({ value: key, words: `${key}° from the mark` })),
  );
  /** The post that is taken where none was chosen is shown as chosen. */
  protected readonly first = computed(() => {
    const { first } = this.form();
    return first === '' ? (this.posts()[0]?.key ?? '') : first;
  });
  protected readonly valves = computed(() =>
    valveFields.map((field) => ({ field, label: valveLabels[field], value: this.form()[field] })),
  );

  protected turn(value: string): void {
    this.changed.emit({ turns: value === 'clockwise' ? 'clockwise' : 'anticlockwise' });
  }

  protected see(value: string): void {
    this.changed.emit({ seenFrom: value === 'drive' ? 'drive' : 'cap' });
  }

  /** Posts that were evenly spaced are there to be changed. */
  protected space(value: string): void {
    const angles =
      this.form().angles.trim() ||
      this.posts()
        .map(({ key }) => key)
        .join(', ');
    this.changed.emit(value === 'typed' ? { spacing: 'typed', angles } : { spacing: 'even' });
  }

  /** Places are named otherwise then, so that what was entered by place no longer holds. */
  protected joinOutlets(value: string): void {
    this.changed.emit({ outlets: value === 'traced' ? 'traced' : 'own', fitted: {} });
  }

  protected time(field: (typeof valveFields)[number], value: string): void {
    this.changed.emit({ [field]: value });
  }
}
