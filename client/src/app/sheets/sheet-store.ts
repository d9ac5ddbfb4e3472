import { computed, DestroyRef, effect, inject, Injectable, signal, untracked } from '@angular/core';
import { rxResource, takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { Sheet, SnagView, StepDetail, StepLine } from '@second-spanner/shared/contracts/sheets';
import { catchError, concatMap, EMPTY, from, type Subscription } from 'rxjs';
import { KeptCopies } from '../offline/kept-copies';
import { WaitingTray } from '../offline/waiting-tray';
import { SessionStore } from '../session/session-store';
import { laterPart } from '../states/later-part';
import { loadJudge } from './kinds/load-judge';
import { sheetNews, type SheetNews } from './sheet-events';
import { stepUrl } from './sheet-api';
import { shownStep, type ShownStep } from './shown-step';
import { ToolsStore } from './tools/tools-store';

const stepsAhead = 8;

/** Why a step's kind can't be worked here. */
export const notOnThisDevice = 'No network. No step of this kind has been opened on this device before.';

/**
 * One sheet while one works on it: the sheet, the step at hand with what waits in the tray laid over it, and its
 * snags where they are shown. Others' work is read as soon as the api tells of it.
 */
@Injectable()
export class SheetStore {
  private readonly tray = inject(WaitingTray);
  private readonly copies = inject(KeptCopies);
  private readonly sessions = inject(SessionStore);
  private readonly tools = inject(ToolsStore);
  private readonly openId = signal<string | null>(null);
  private readonly openCode = signal<string | null>(null);
  private readonly wantsSnags = signal(false);
  /** Told of a change while a reading of it was under way: it must be read once more. */
  private readonly isStale = signal(false);

  readonly sheet = rxResource({
    params: () => this.openId() ?? undefined,
    stream: ({ params: id }) => this.copies.read<Sheet>(`/api/sheets/${id}`),
  });
  readonly detail = rxResource({
    params: () => {
      const [id, code] = [this.openId(), this.openCode()];
      return id === null || code === null ? undefined : stepUrl(id, code);
    },
    stream: ({ params: url }) => this.copies.read<StepDetail>(url),
  });
  readonly snags = rxResource({
    params: () => (this.wantsSnags() ? (this.openId() ?? undefined) : undefined),
    stream: ({ params: id }) => this.copies.read<readonly SnagView[]>(`/api/sheets/${id}/snags`),
  });

  readonly id = computed(() => this.openId() ?? '');
  readonly code = this.openCode.asReadonly();
  readonly stages = computed(() => (this.sheet.hasValue() ? this.sheet.value().stages : []));
  readonly lines = computed<readonly StepLine[]>(() => this.stages().flatMap(({ steps }) => steps));
  /** The kind of the step at hand, which the sheet's list may tell before the step itself is read. */
  readonly kind = computed(() => {
    if (this.detail.hasValue()) return this.detail.value().kind;
    return this.lines().find(({ code }) => code === this.openCode())?.kind ?? null;
  });
  /** The judge of that kind, on its way or here. */
  readonly judging = laterPart(() => {
    const kind = this.kind();
    return kind === null ? undefined : loadJudge[kind];
  }, notOnThisDevice);
  readonly judge = computed(() => (this.judging.hasValue() ? this.judging.value() : null));
  readonly step = computed<ShownStep | null>(() => {
    const person = this.sessions.person();
    if (!this.detail.hasValue() || person === null) return null;
    const detail = this.detail.value();
    const items = this.tray
      .items()
      .filter(({ sheetId, stepCode }) => sheetId === detail.sheetId && stepCode === detail.code);
    return shownStep(detail, items, person, { judge: this.judge(), tools: this.tools.all() });
  });

  constructor() {
    let line: Subscription | undefined;
    effect(() => {
      const id = this.openId();
      line?.unsubscribe();
      line =
        id === null ? undefined : sheetNews(id, () => this.refresh()).subscribe((news) => this.hear(news));
    });
    inject(DestroyRef).onDestroy(() => line?.unsubscribe());

    effect(() => {
      if (!this.isStale() || this.sheet.isLoading() || this.detail.isLoading()) return;
      untracked(() => this.refresh());
    });
    effect(() => {
      // With every step that is opened, once the step itself is there.
      const [id, step] = [this.openId(), this.detail.hasValue() ? this.detail.value().code : null];
      if (id !== null && step !== null && this.sheet.hasValue()) untracked(() => this.readAhead(id));
    });
    this.tray.sent.pipe(takeUntilDestroyed()).subscribe((step) => this.take(step));
  }

  open(id: string): void {
    this.openId.set(id);
  }

  openStep(code: string | null): void {
    this.openCode.set(code);
  }

  openSnags(): void {
    this.wantsSnags.set(true);
  }

  /** A step as the api answered it to an act; the sheet's list is read anew. */
  take(step: StepDetail): void {
    if (step.sheetId !== this.openId()) return;
    const isOlder = this.detail.hasValue() && this.detail.value().version > step.version;
    if (step.code === this.openCode() && !isOlder) this.detail.set(step);
    void this.copies.keep(stepUrl(step.sheetId, step.code), step);
    this.sheet.reload();
    this.snags.reload();
  }

  takeSheet(sheet: Sheet): void {
    this.sheet.set(sheet);
    void this.copies.keep(`/api/sheets/${sheet.id}`, sheet);
    this.detail.reload();
  }

  /** Copies of the steps that come next, so that they can be opened where there is no network. */
  private readAhead(id: string): void {
    if (!this.sessions.may('entries.record')) return;
    const lines = this.lines();
    const at = Math.max(
      0,
      lines.findIndex(({ code }) => code === this.openCode()),
    );
    const ahead = lines.slice(at).filter(({ status }) => status !== 'done');
    const urls = ahead.slice(0, stepsAhead).map(({ code }) => stepUrl(id, code));
    from(urls.filter((url) => !this.copies.wasReadHere(url)))
      .pipe(concatMap((url) => this.copies.read<StepDetail>(url).pipe(catchError(() => EMPTY))))
      .subscribe();
  }

  private hear(news: SheetNews): void {
    const known = this.sheet.hasValue() ? this.sheet.value().version : -1;
    if (news === 'line-open' ? known >= 0 : news.version > known) this.refresh();
  }

  private refresh(): void {
    const isLoading = this.sheet.status() === 'loading' || this.detail.status() === 'loading';
    this.isStale.set(isLoading);
    this.sheet.reload();
    this.detail.reload();
    this.snags.reload();
  }
}
