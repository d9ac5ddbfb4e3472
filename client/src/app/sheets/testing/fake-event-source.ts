import type { SheetChanged } from '@second-spanner/shared/contracts/sheets';

/** Stands in for the browser's EventSource: tests tell the news themselves. */
export class FakeEventSource extends EventTarget {
  static readonly OPEN = 1;
  static readonly CLOSED = 2;
  static readonly opened: FakeEventSource[] = [];

  readyState: number = FakeEventSource.OPEN;

  constructor(readonly url: string) {
    super();
    FakeEventSource.opened.push(this);
  }

  tell(news: SheetChanged): void {
    this.dispatchEvent(new MessageEvent('changed', { data: JSON.stringify(news) }));
  }

  giveUp(): void {
    this.readyState = FakeEventSource.CLOSED;
    this.dispatchEvent(new Event('error'));
  }

  close(): void {
    this.readyState = FakeEventSource.CLOSED;
  }
}
