import { computed, effect, inject, Injectable, signal, untracked } from '@angular/core';
import type { NewEntryRequest, StepDetail } from '@second-spanner/shared/contracts/sheets';
import { Subject } from 'rxjs';
import { ApiProblem } from '../http/api-problem';
import { Network } from '../http/network';
import { SessionStore } from '../session/session-store';
import { newKey } from './new-key';
import { SendItem, type Sent } from './send-item';
import { TrayDb } from './tray-db';
import type { NewTrayItem, TrayItem } from './tray-item';

/** What a page hands to the tray. */
export interface ToKeep {
  readonly sheetId: string;
  readonly sheetCode: string;
  readonly stepCode: string;
  readonly words: string;
  readonly request: NewEntryRequest;
  readonly photo?: Blob;
}

const triedAgainEvery = 10_000;

/**
 * Entries on their way to the api. Each is kept on the device before it is sent and leaves when the api has taken
 * it, so that none is lost; they go one by one in the order in which they were made, and without a network they
 * wait. One that the api refuses after having waited stays with the reason, for its person to put right or take out.
 */
@Injectable({ providedIn: 'root' })
export class WaitingTray {
  private readonly db = inject(TrayDb);
  private readonly sender = inject(SendItem);
  private readonly network = inject(Network);
  private readonly sessions = inject(SessionStore);

  private readonly lying = signal<readonly TrayItem[]>([]);
  private readonly taken = new Subject<StepDetail>();
  /** Pages that wait to hear what became of their entry, by its key. */
  private readonly asking = new Map<string, (sent: Sent) => void>();
  private round: Promise<void> = Promise.resolve();
  private timer: ReturnType<typeof setTimeout> | undefined;

  /** The signed-in person's own items: nobody else's are shown or sent. */
  readonly items = computed(() => {
    const person = this.sessions.person();
    return this.lying().filter(({ personId }) => personId === person?.id);
  });
  /** How much of a photo under way is sent, 0 to 1; null while none is. */
  readonly photoShare = this.sender.photoShare.asReadonly();
  readonly count = computed(() => this.items().length);
  /** Steps as they are after an entry was taken. */
  readonly sent = this.taken.asObservable();

  constructor() {
    effect(() => {
      const ready = this.network.reachable() && this.sessions.person() !== null;
      if (ready) untracked(() => void this.sendAll());
    });
    void this.read();
  }

  /** Keeps an entry on the device and sends it, behind those that wait already. */
  async keep(what: ToKeep): Promise<Sent> {
    const personId = this.sessions.person()?.id ?? '';
    const photo = what.photo && { bytes: await what.photo.arrayBuffer(), type: what.photo.type };
    const item: NewTrayItem = { ...what, photo, key: newKey(), personId, keptAt: new Date().toISOString() };
    try {
      await this.db.add(item);
    } catch {
      return this.sendUnkept(item);
    }
    await this.read();
    return new Promise((resolve) => {
      this.asking.set(item.key, resolve);
      void this.sendAll();
    });
  }

  /** A browser that keeps nothing, as some private windows: sent at once or not at all, and the page says so. */
  private async sendUnkept(item: NewTrayItem): Promise<Sent> {
    const sent = await this.sender.send({ ...item, seq: -1 });
    if (sent.state === 'kept') this.taken.next(sent.step);
    if (sent.state !== 'waiting') return sent;
    return {
      state: 'refused',
      problem: new ApiProblem(0, 'No network, and this browser window keeps nothing.'),
    };
  }

  /** Takes an item out for good. */
  async remove(seq: number): Promise<void> {
    await this.db.take(seq);
    await this.read();
  }

  /** Sends what waits, after a round that is under way. */
  sendAll(): Promise<void> {
    this.round = this.round.then(() => this.sendInOrder());
    return this.round;
  }

  private async sendInOrder(): Promise<void> {
    clearTimeout(this.timer);
    await this.read();
    for (const item of this.items()) {
      if (item.refused !== undefined) continue;
      const sent = await this.sender.send(item);
      if (sent.state === 'waiting') {
        this.answerAll(sent);
        this.timer = setTimeout(() => void this.sendAll(), triedAgainEvery);
        break;
      }
      await this.settle(item, sent);
    }
    await this.read();
  }

  private async settle(item: TrayItem, sent: Exclude<Sent, { state: 'waiting' }>): Promise<void> {
    const asks = this.asking.get(item.key);
    this.asking.delete(item.key);
    if (sent.state === 'kept') this.taken.next(sent.step);
    // Whoever still stands at the page hears the refusal there, with what was typed: nothing then stays behind.
    if (sent.state === 'kept' || asks !== undefined) await this.db.take(item.seq);
    else await this.db.put({ ...item, refused: sent.problem.sentence });
    await this.read();
    asks?.(sent);
  }

  private answerAll(sent: Sent): void {
    for (const answer of this.asking.values()) answer(sent);
    this.asking.clear();
  }

  private async read(): Promise<void> {
    try {
      this.lying.set(await this.db.all());
    } catch {
      this.lying.set([]);
    }
  }
}
