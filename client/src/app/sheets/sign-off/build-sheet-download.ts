import { DOCUMENT } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { saveFile } from '../../http/save-file';
import { SaveLine } from '../saving/save-line';
import { Saving } from '../saving/save-state';
import { SheetApi } from '../sheet-api';
import { SheetStore } from '../sheet-store';

/** The build sheet as a PDF, on the paper of choice. */
@Component({
  selector: 'ss-build-sheet-download',
  imports: [MatButton, SaveLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2>Build sheet</h2>
    <fieldset>
      <legend class="visually-hidden">Paper</legend>
      <label
        ><input type="radio" name="paper" [checked]="paper() === 'a4'" (change)="paper.set('a4')" />A4</label
      >
      <label>
        <input
          type="radio"
          name="paper"
          [checked]="paper() === 'letter'"
          (change)="paper.set('letter')"
        />Letter
      </label>
    </fieldset>
    <button
      matButton="outlined"
      type="button"
      [disabled]="reading.state().state === 'saving'"
      (click)="download()"
    >
      {{ reading.state().state === 'saving' ? 'Making the PDF…' : 'Download the PDF' }}
    </button>
    @if (reading.state().state === 'failed') {
      <ss-save-line [of]="reading.state()" />
    }
  `,
  styles: `
    :host {
      display: block;
      padding-top: var(--ss-4);
    }

    h2 {
      font: var(--ss-t-strong);
    }

    fieldset {
      display: flex;
      gap: var(--ss-5);
      margin: 0;
      padding: 0;
      border: 0;
    }

    label {
      display: flex;
      align-items: center;
      gap: var(--ss-2);
      min-height: 48px;
      cursor: pointer;
    }

    input {
      width: 20px;
      height: 20px;
      margin: 0;
      accent-color: var(--ss-blue);
    }
  `,
})
export class BuildSheetDownload {
  private readonly api = inject(SheetApi);
  private readonly store = inject(SheetStore);
  private readonly document = inject(DOCUMENT);

  protected readonly reading = new Saving();
  protected readonly paper = signal<'a4' | 'letter'>('a4');

  protected async download(): Promise<void> {
    const pdf = await this.reading.follow(this.api.buildSheet(this.store.id(), this.paper()));
    if (pdf === null) return;
    const code = this.store.sheet.hasValue() ? this.store.sheet.value().code : 'sheet';
    saveFile(this.document, pdf, `build-sheet-${code}.pdf`);
  }
}
