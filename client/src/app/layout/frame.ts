import { NgTemplateOutlet } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { RouterLink, RouterOutlet } from '@angular/router';
import { Network } from '../http/network';
import { FrameParts } from './frame-parts';
import { Light } from './light';
import { Mark } from './mark';
import { Nav } from './nav';

/** The drawing sheet around every page: mark and navigation at the left on the desk, a menu on the phone. */
@Component({
  selector: 'ss-frame',
  imports: [Mark, MatIcon, Nav, NgTemplateOutlet, RouterLink, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './frame.html',
  styleUrl: './frame.scss',
})
export class Frame {
  protected readonly parts = inject(FrameParts);
  private readonly lights = inject(Light);
  private readonly menu = viewChild.required<ElementRef<HTMLDialogElement>>('menu');

  protected readonly reachable = inject(Network).reachable;
  protected readonly otherLight = computed(() => (this.lights.light() === 'day' ? 'Lamp' : 'Day'));

  constructor() {
    effect(() => {
      const dialog = this.menu().nativeElement;
      if (this.parts.menuOpen()) dialog.showModal();
      else dialog.close();
    });
  }

  protected closeMenu(): void {
    this.parts.menuOpen.set(false);
  }

  protected turnLight(): void {
    this.lights.toggle();
  }

  protected skipToPage(page: HTMLElement, event: Event): void {
    event.preventDefault();
    page.focus();
  }
}
