import { Injectable, signal, type TemplateRef } from '@angular/core';

/** What pages hand to the frame around them. */
@Injectable({ providedIn: 'root' })
export class FrameParts {
  /** Stands in the left column on the desk instead of the navigation, such as a sheet's stages. */
  readonly aside = signal<TemplateRef<unknown> | null>(null);
  readonly menuOpen = signal(false);
}
