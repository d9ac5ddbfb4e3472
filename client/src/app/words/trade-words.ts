import { inject, Pipe, type PipeTransform } from '@angular/core';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { SessionStore } from '../session/session-store';

/** Sets the trade words of a text (`{sump}`) in the person's dialect. Impure, so that a switch shows at once. */
@Pipe({ name: 'tradeWords', pure: false })
export class TradeWords implements PipeTransform {
  private readonly sessions = inject(SessionStore);

  transform(text: string): string {
    return tradeText(text, this.sessions.dialect());
  }
}
