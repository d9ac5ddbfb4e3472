import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { Router, RouterLink } from '@angular/router';
import { FrameParts } from './frame-parts';
import { Light } from './light';
import { Mark } from './mark';

/**
 * A page's head: ruled cells, the page's name in the wide one. On the phone two rows: where I am, with the
 * way back and the menu, and which step. Give further cells as `<ss-cell>`; those with the attribute
 * `where` stay in the phone's first row.
 */
@Component({
  selector: 'ss-title-block',
  imports: [Mark, MatIcon, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './title-block.html',
  styleUrl: './title-block.scss',
})
export class TitleBlock {
  protected readonly frame = inject(FrameParts);
  private readonly lights = inject(Light);
  private readonly name = viewChild<ElementRef<HTMLElement>>('name');

  readonly caption = input.required<string>();
  readonly heading = input.required<string>();
  /** Whether the heading is the page's h1. Off where the page has its own below, as a step on the phone. */
  readonly main = input(true);
  /** Where the phone's back arrow leads; without it the mark leads to the bench. */
  readonly back = input<string | readonly string[] | null>(null);
  readonly backLabel = input('Back');

  protected readonly light = computed(() => (this.lights.light() === 'day' ? 'Day' : 'Lamp'));

  constructor() {
    const isFirstPage = inject(Router).lastSuccessfulNavigation()?.id === 1;
    // A page that takes another's place takes the focus, so that its name is read out.
    if (!isFirstPage) afterNextRender(() => this.name()?.nativeElement.focus({ preventScroll: true }));
  }

  protected turnLight(): void {
    this.lights.toggle();
  }

  protected openMenu(): void {
    this.frame.menuOpen.set(true);
  }
}
