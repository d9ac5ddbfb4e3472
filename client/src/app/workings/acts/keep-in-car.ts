import { NgComponentOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { WorkingCase } from '@second-spanner/shared/workings/working';
import { laterPart, type LoadPart } from '../../states/later-part';
import { LoadState } from '../../states/load-state';
import type { KeptInCar } from './keep-dialog';

const loadDialog: LoadPart = async () => (await import('./keep-dialog')).KeepDialog;

/** Keeps a working in a car's file: opens the dialog that asks which car, and says where it was kept. */
@Component({
  selector: 'ss-keep-in-car',
  imports: [LoadState, MatButton, NgComponentOutlet, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <button matButton type="button" (click)="open()">Keep in a car file</button>
    <p class="small" role="status">
      @if (kept(); as kept) {
        Kept as “{{ kept.title }}” with <a [routerLink]="['/cars', kept.car.id]">{{ kept.car.name }}</a>.
      }
    </p>
    @if (isOpen()) {
      @if (dialog.hasValue()) {
        <ng-container *ngComponentOutlet="dialog.value(); inputs: inputs()" />
      } @else {
        <ss-load-state what="the car files" [from]="dialog" />
      }
    }
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
    }

    p:empty {
      display: none;
    }
  `,
})
export class KeepInCar {
  readonly working = input.required<string>();
  readonly title = input.required<string>();
  readonly typed = input.required<WorkingCase>();

  private readonly wasOpened = signal(false);
  protected readonly isOpen = signal(false);
  protected readonly kept = signal<KeptInCar | null>(null);
  protected readonly dialog = laterPart(() => (this.wasOpened() ? loadDialog : undefined));
  protected readonly inputs = computed(() => ({
    working: this.working(),
    title: this.title(),
    typed: this.typed(),
    lastCar: this.kept()?.car.id ?? '',
    closed: this.closed,
  }));

  protected open(): void {
    this.wasOpened.set(true);
    this.isOpen.set(true);
  }

  private readonly closed = (kept: KeptInCar | null): void => {
    this.isOpen.set(false);
    if (kept !== null) this.kept.set(kept);
  };
}
