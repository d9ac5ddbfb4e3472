import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { WaitingTray } from '../../offline/waiting-tray';
import { Cell } from '../../layout/cell';
import { TitleBlock } from '../../layout/title-block';
import { stateNames } from '../../words/names';
import { SheetStore } from '../sheet-store';
import { Wide } from '../wide';

/** A cell of a step's head. */
export interface HeadCell {
  readonly caption: string;
  readonly value: string;
  readonly figures?: boolean;
}

/**
 * The title block of every page of a sheet. On the desk it says which sheet; on the phone also where in it one is,
 * in the page's own cells.
 */
@Component({
  selector: 'ss-sheet-head',
  imports: [Cell, TitleBlock],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ss-title-block
      [caption]="isDesk() ? sheetWords() : (caption() ?? carWords())"
      [heading]="isDesk() ? carWords() : heading()"
      [main]="false"
      [back]="back()"
      [backLabel]="backLabel()"
    >
      @if (waiting() > 0) {
        <ss-cell where caption="Waiting tray" [figures]="true">{{ waiting() }}</ss-cell>
      }
      @for (cell of shownCells(); track cell.caption) {
        <ss-cell [caption]="cell.caption" [figures]="cell.figures ?? false">{{ cell.value }}</ss-cell>
      }
    </ss-title-block>
  `,
})
export class SheetHead {
  private readonly store = inject(SheetStore);

  /** The phone's page name: the stage, or what the page is. */
  readonly heading = input.required<string>();
  /** Over it, in place of the car and its engine. */
  readonly caption = input<string | null>(null);
  /** The phone's second row. */
  readonly cells = input<readonly HeadCell[]>([]);
  readonly back = input<readonly string[] | null>(null);
  readonly backLabel = input('Back');

  protected readonly isDesk = inject(Wide).isDesk;
  protected readonly waiting = inject(WaitingTray).count;

  private readonly sheet = computed(() => (this.store.sheet.hasValue() ? this.store.sheet.value() : null));
  protected readonly carWords = computed(() => {
    const sheet = this.sheet();
    return sheet === null ? 'Assembly sheet' : `${sheet.carName}, engine ${sheet.engineCode}`;
  });
  protected readonly sheetWords = computed(() => {
    const sheet = this.sheet();
    return sheet === null ? '' : `Assembly sheet ${sheet.code}, ${stateNames[sheet.state]}`;
  });
  protected readonly shownCells = computed<readonly HeadCell[]>(() => {
    const sheet = this.sheet();
    if (!this.isDesk()) return this.cells();
    if (sheet === null) return [];
    return [
      { caption: 'Spec', value: `${sheet.engineCode}, edition ${sheet.specEdition}` },
      { caption: 'Builder', value: sheet.builder.name },
      { caption: 'Second person', value: sheet.countersigner.name },
      { caption: 'Steps done', value: `${sheet.stepsDone} of ${sheet.stepsTotal}` },
    ];
  });
}
