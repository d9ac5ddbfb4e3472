import { Directive, inject, TemplateRef, type OnDestroy, type OnInit } from '@angular/core';
import { FrameParts } from './frame-parts';

/**
 * A page's own left column on the desk, in place of the navigation:
 * `<ng-template ssFrameAside>…</ng-template>` anywhere in the page. On the phone it is not shown.
 */
@Directive({ selector: 'ng-template[ssFrameAside]' })
export class FrameAside implements OnInit, OnDestroy {
  private readonly frame = inject(FrameParts);
  private readonly template = inject<TemplateRef<unknown>>(TemplateRef);

  ngOnInit(): void {
    this.frame.aside.set(this.template);
  }

  ngOnDestroy(): void {
    if (this.frame.aside() === this.template) this.frame.aside.set(null);
  }
}
