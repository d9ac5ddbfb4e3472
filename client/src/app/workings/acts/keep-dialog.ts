import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  signal,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { WorkingCase } from '@second-spanner/shared/workings/working';
import { ChosenField, type Choice } from '../../fields/chosen-field';
import { TypedField } from '../../fields/typed-field';
import { Saving } from '../../sheets/saving/save-state';
import { LoadState } from '../../states/load-state';
import { ProblemLine } from '../../states/problem-line';
import { WorkingsApi } from '../workings-api';

/** Where a working was kept, and under what name. */
export interface KeptInCar {
  readonly car: CarSummary;
  readonly title: string;
}

/** Which car a working is kept with, and under what name. Stands open as long as it is there. */
@Component({
  selector: 'ss-keep-dialog',
  imports: [ChosenField, LoadState, MatButton, ProblemLine, TypedField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './keep-dialog.html',
  styleUrl: './keep-dialog.scss',
})
export class KeepDialog {
  private readonly api = inject(WorkingsApi);
  private readonly dialog = viewChild.required<ElementRef<HTMLDialogElement>>('dialog');

  readonly working = input.required<string>();
  readonly title = input.required<string>();
  readonly typed = input.required<WorkingCase>();
  /** Id of the car that one was kept with last; chosen at first. */
  readonly lastCar = input.required<string>();
  /** Told when the dialog closes: where it was kept, or that it was not. */
  readonly closed = input.required<(kept: KeptInCar | null) => void>();

  protected readonly cars = rxResource({ stream: () => this.api.cars() });
  protected readonly choices = computed<readonly Choice[]>(() =>
    this.known().map(({ id, name, code }) => ({ value: id, words: `${name}, ${code}` })),
  );

  protected readonly car = linkedSignal(() => this.lastCar());
  protected readonly name = linkedSignal(() => this.title());
  protected readonly tried = signal(false);
  protected readonly keeping = new Saving();

  constructor() {
    afterNextRender(() => this.dialog().nativeElement.showModal());
  }

  protected close(kept: KeptInCar | null = null): void {
    this.dialog().nativeElement.close();
    this.closed()(kept);
  }

  protected async keep(event: Event): Promise<void> {
    event.preventDefault();
    this.tried.set(true);
    const car = this.known().find(({ id }) => id === this.car());
    const title = this.name().trim();
    if (car === undefined || title === '') return;
    const request = { working: this.working(), title, typed: this.typed() };
    if ((await this.keeping.follow(this.api.keep(car.id, request))) !== null) this.close({ car, title });
  }

  private known(): readonly CarSummary[] {
    return this.cars.hasValue() ? this.cars.value() : [];
  }
}
