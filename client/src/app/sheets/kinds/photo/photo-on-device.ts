import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { WaitingTray } from '../../../offline/waiting-tray';

/** A photo that still lies in the waiting tray, shown from there. */
@Component({
  selector: 'ss-photo-on-device',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (url(); as source) {
      <img [src]="source" [alt]="alt()" />
    }
  `,
  styles: `
    img {
      display: block;
      width: 100%;
      aspect-ratio: 4 / 3;
      object-fit: cover;
      border: 1px dashed var(--ss-thin);
    }
  `,
})
export class PhotoOnDevice {
  private readonly tray = inject(WaitingTray);

  readonly seq = input.required<number>();
  readonly alt = input.required<string>();

  private readonly photo = computed(
    () => this.tray.items().find(({ seq }) => seq === this.seq())?.photo ?? null,
  );
  protected readonly url = signal<string | null>(null);

  constructor() {
    effect((onCleanup) => {
      const photo = this.photo();
      const url = photo === null ? null : URL.createObjectURL(new Blob([photo.bytes], { type: photo.type }));
      this.url.set(url);
      onCleanup(() => {
        if (url !== null) URL.revokeObjectURL(url);
      });
    });
  }
}
