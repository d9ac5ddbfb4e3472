import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  signal,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { WorkingCase } from '@second-spanner/shared/workings/working';
import { of } from 'rxjs';
import { ChosenField, type Choice } from '../../fields/chosen-field';
import { TypedField } from '../../fields/typed-field';
import { Saving } from '../../sheets/saving/save-state';
import { LoadState } from '../../states/load-state';
import { ProblemLine } from '../../states/problem-line';
import { WorkingsApi } from '../workings-api';

/** Keeps a working in a car's file: which car, and under what name. */
@Component({
  selector: 'ss-keep-in-car',
  imports: [ChosenField, LoadState, MatButton, ProblemLine, RouterLink, TypedField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './keep-in-car.html',
  styleUrl: './keep-in-car.scss',
})
export class KeepInCar {
  private readonly api = inject(WorkingsApi);
  private readonly dialog = viewChild.required<ElementRef<HTMLDialogElement>>('dialog');

  readonly working = input.required<string>();
  readonly title = input.required<string>();
  readonly typed = input.required<WorkingCase>();

  /** The cars are read when they are first asked for. */
  private readonly asked = signal(false);
  protected readonly cars = rxResource({
    params: () => (this.asked() ? {} : undefined),
    stream: () => (this.asked() ? this.api.cars() : of([])),
  });
  protected readonly choices = computed<readonly Choice[]>(() =>
    this.known().map(({ id, name, code }) => ({ value: id, words: `${name}, ${code}` })),
  );

  protected readonly car = signal('');
  protected readonly name = signal('');
  protected readonly tried = signal(false);
  protected readonly keeping = new Saving();
  protected readonly kept = signal<{ readonly car: CarSummary; readonly title: string } | null>(null);

  protected open(): void {
    this.asked.set(true);
    this.name.set(this.title());
    this.tried.set(false);
    this.keeping.set({ state: 'none' });
    this.dialog().nativeElement.showModal();
  }

  protected close(): void {
    this.dialog().nativeElement.close();
  }

  protected async keep(event: Event): Promise<void> {
    event.preventDefault();
    this.tried.set(true);
    const car = this.known().find(({ id }) => id === this.car());
    const title = this.name().trim();
    if (car === undefined || title === '') return;
    const request = { working: this.working(), title, typed: this.typed() };
    if ((await this.keeping.follow(this.api.keep(car.id, request))) === null) return;
    this.kept.set({ car, title });
    this.close();
  }

  private known(): readonly CarSummary[] {
    return this.cars.hasValue() ? this.cars.value() : [];
  }
}
