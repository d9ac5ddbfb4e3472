import { computed, inject, Injectable, signal } from '@angular/core';
import { InputError } from '@second-spanner/shared/contracts/input-error';
import type { NewEntryRequest } from '@second-spanner/shared/contracts/sheets';
import type { EntryContent, StepDefinition } from '@second-spanner/shared/contracts/steps';
import type { Judgement } from '@second-spanner/shared/contracts/verdict';
import { takesEntries } from '@second-spanner/shared/sheet/sheet-states';
import { slotKeyOf } from '@second-spanner/shared/sheet/slots';
import { WaitingTray } from '../offline/waiting-tray';
import { SessionStore } from '../session/session-store';
import { draft } from './drafts/draft';
import { entryWords } from './entry-words';
import { opensByTray } from './open-offline';
import { failingSlot, filledSlots, nextSlot, slotAfter } from './next-slot';
import { Saving } from './saving/save-state';
import { SheetStore } from './sheet-store';
import type { ShownEntry } from './shown-step';
import { ToolsStore } from './tools/tools-store';

/** What a page's fields come to: a judgement, or which field keeps it from one. */
export interface Judged {
  readonly judgement: Judgement | null;
  readonly error: InputError | null;
}

const isText = (value: unknown): value is string => typeof value === 'string';

/** The recording on one step: which slot is at hand, what replaces what, and the way of an entry to the tray. */
@Injectable()
export class StepWork {
  private readonly store = inject(SheetStore);
  private readonly tray = inject(WaitingTray);
  private readonly tools = inject(ToolsStore);
  private readonly sessions = inject(SessionStore);

  readonly saving = new Saving();
  /** Why an entry is replaced, as typed. */
  readonly reason = draft(() => this.draftKey('reason'), '', isText);
  /** The page's own finding about a field that an attempt to keep brought up. */
  readonly fieldError = signal<InputError | null>(null);

  /** How much of a photo under way is sent, 0 to 1; null while none is. */
  readonly sendingShare = this.tray.photoShare;

  private readonly step = this.store.step;
  /** A slot that the person chose; otherwise the work goes on in its order. */
  private readonly chosen = signal<string | null>(null);
  private readonly lastKept = signal<string | null>(null);
  /** Slots whose entry is on its way: a second touch of the button sends nothing. */
  private readonly sending = new Set<string>();

  readonly slots = computed(() => {
    const step = this.step();
    return step === null ? [] : filledSlots(step.definition, step.entries, step.done);
  });
  /** What is recorded next; null when nothing is empty. */
  readonly slot = computed(() => {
    const slots = this.slots();
    const chosen = this.chosen();
    return slots.find(({ key }) => key === chosen) ?? nextSlot(slots, this.lastKept());
  });
  /** With nothing empty: what must be recorded once more, if anything. */
  readonly toRepeat = computed(() => {
    return this.slot() === null ? failingSlot(this.slots()) : null;
  });
  /** What comes after the slot at hand. */
  readonly following = computed(() => {
    const slot = this.slot();
    return slot === null ? null : slotAfter(this.slots(), slot);
  });
  /** The entry that the next one would replace. */
  readonly replaced = computed<ShownEntry | null>(() => this.slot()?.entry ?? null);
  /** Whether this person may record here now. */
  readonly isOpen = computed(() => {
    const step = this.step();
    if (step === null || step.covered) return false;
    return (
      step.can.record || (this.takesEntries() && opensByTray(step, this.store.lines(), this.tray.items()))
    );
  });

  private readonly takesEntries = computed(
    () =>
      this.sessions.may('entries.record') &&
      this.store.sheet.hasValue() &&
      takesEntries(this.store.sheet.value().state),
  );

  draftKey(part: string): string {
    return `${this.store.id()}/${this.store.code() ?? ''}/${part}`;
  }

  choose(slotKey: string | null): void {
    this.chosen.set(slotKey);
    this.saving.set({ state: 'none' });
  }

  correct(entry: ShownEntry): void {
    this.choose(slotKeyOf(entry.content));
  }

  /** Something is changed: what was said of it before no longer counts. */
  touched(): void {
    this.fieldError.set(null);
    if (this.saving.problem !== null) this.saving.set({ state: 'none' });
  }

  /** Judges content as it stands, by the same rules that the api has. */
  judge(definition: StepDefinition, content: EntryContent): Judged {
    const judge = this.store.judge();
    if (judge === null) return { judgement: null, error: null };
    const on = new Date().toISOString().slice(0, 10);
    try {
      return { judgement: judge(definition, content, { tools: this.tools.all(), on }), error: null };
    } catch (error) {
      if (error instanceof InputError) return { judgement: null, error };
      throw error;
    }
  }

  /** The sentence for a field: what this page found, or what the api said. */
  errorAt(field: string): string | null {
    const here = this.fieldError();
    return here?.field === field ? here.message : (this.saving.problem?.errorAt(field) ?? null);
  }

  /**
   * Keeps an entry; true when it is kept, at the api or in the tray. The page moves on to the next slot at once; a
   * refused entry brings its own slot back to hand.
   */
  async record(definition: StepDefinition, content: EntryContent, photo?: Blob): Promise<boolean> {
    const slotKey = slotKeyOf(content);
    const request = this.requestFor(content);
    if (request === null || this.sending.has(slotKey)) return false;
    const reason = this.reason();
    this.sending.add(slotKey);
    this.moveOn(slotKey);
    await this.clearTray(slotKey);
    const sent = await this.tray.keep({
      sheetId: this.store.id(),
      sheetCode: this.store.sheet.hasValue() ? this.store.sheet.value().code : '',
      stepCode: definition.code,
      words: entryWords(definition, content),
      request,
      photo,
    });
    this.sending.delete(slotKey);
    if (sent.state === 'refused') {
      this.chosen.set(slotKey);
      this.reason.set(reason);
      this.saving.set({ state: 'failed', problem: sent.problem });
      return false;
    }
    if (sent.state === 'kept') this.saving.kept();
    else this.saving.set({ state: 'waiting' });
    return true;
  }

  private moveOn(slotKey: string): void {
    this.saving.set({ state: 'saving' });
    this.fieldError.set(null);
    this.reason.set('');
    this.chosen.set(null);
    this.lastKept.set(slotKey);
  }

  /** What lies in the tray for a slot was never recorded: it makes room, and replaces nothing. */
  private async clearTray(slotKey: string): Promise<void> {
    const lying = this.step()?.entries.filter(({ content }) => slotKeyOf(content) === slotKey) ?? [];
    for (const { inTray } of lying) {
      if (inTray !== null) await this.tray.remove(inTray.seq);
    }
  }

  private requestFor(content: EntryContent): NewEntryRequest | null {
    const replaced = this.replaced();
    if (replaced === null) return { content };
    const { inTray, replaces, replaceReason } = replaced;
    if (inTray !== null) {
      return { content, replaces: replaces ?? undefined, reason: replaceReason ?? undefined };
    }
    const reason = this.reason().trim();
    if (reason === '') {
      this.fieldError.set(new InputError('reason', 'Say why this entry replaces the one before.'));
      return null;
    }
    return { content, replaces: replaced.id, reason };
  }
}
