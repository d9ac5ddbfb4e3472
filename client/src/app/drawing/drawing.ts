import { DOCUMENT } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  effect,
  ElementRef,
  inject,
  input,
  output,
  viewChild,
} from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { Drawing } from '@second-spanner/shared/drawing/shapes';
import { svgNodes, svgStyles } from '@second-spanner/shared/drawing/to-svg';
import { svgElements } from './svg-elements';

const styleId = 'drawing-styles';
let drawings = 0;

/** A drawing as a figure: caption, the drawing itself, the table that says the same, and printing it alone. */
@Component({
  selector: 'ss-drawing',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  // Touching a part is a short cut only: whatever it does can be done by the controls beside the drawing.
  host: { '(click)': 'touch($event)' },
  templateUrl: './drawing.html',
  styleUrl: './drawing.scss',
})
export class DrawingFigure {
  private readonly document = inject(DOCUMENT);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly sheet = viewChild.required<ElementRef<SVGSVGElement>>('sheet');

  readonly of = input.required<Drawing>();
  readonly caption = input<string | null>(null);
  /** Small drawings on lists go without table and printing; their page has both. */
  readonly bare = input(false);
  /** Widest on the page, CSS pixels. */
  readonly widest = input<number | null>(null);
  /** The part that was touched, such as `lead:B`. */
  readonly touched = output<string>();

  protected readonly id = `drawing-${(drawings += 1)}`;

  constructor() {
    this.addStyles();
    effect(() => {
      this.sheet()
        .nativeElement.querySelector('g')
        ?.replaceChildren(...svgElements(this.document, svgNodes(this.of())));
    });
  }

  protected touch(event: Event): void {
    const part = event.target instanceof Element ? event.target.closest('[data-part]') : null;
    const name = part?.getAttribute('data-part');
    if (name !== null && name !== undefined) this.touched.emit(name);
  }

  protected printAlone(): void {
    const { body, defaultView } = this.document;
    const element = this.host.nativeElement;
    body.dataset['print'] = 'drawing';
    element.classList.add('print-alone');
    defaultView?.addEventListener(
      'afterprint',
      () => {
        delete body.dataset['print'];
        element.classList.remove('print-alone');
      },
      { once: true },
    );
    defaultView?.print();
  }

  /** The pens and inks of every drawing, once a page; they follow the light by the page's tokens. */
  private addStyles(): void {
    if (this.document.getElementById(styleId) !== null) return;
    const style = this.document.createElement('style');
    style.id = styleId;
    style.textContent = svgStyles('.ss-drawing');
    this.document.head.append(style);
  }
}
