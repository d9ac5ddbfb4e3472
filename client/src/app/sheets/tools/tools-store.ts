import { computed, inject, Injectable } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import { KeptCopies } from '../../offline/kept-copies';
import { recall, remember } from '../../remembered/remembered';
import { SessionStore } from '../../session/session-store';

/** The shop's tools, and which of them a person last took for what. */
@Injectable({ providedIn: 'root' })
export class ToolsStore {
  private readonly sessions = inject(SessionStore);
  private readonly copies = inject(KeptCopies);

  readonly tools = rxResource({
    params: () => (this.sessions.may('tools.read') ? '/api/tools' : undefined),
    stream: ({ params: url }) => this.copies.read<readonly Tool[]>(url),
  });
  readonly all = computed<readonly Tool[]>(() => (this.tools.hasValue() ? this.tools.value() : []));

  byId(id: string): Tool | undefined {
    return this.all().find((tool) => tool.id === id);
  }

  /** The tool that was last used on this device for such work, or an empty text. */
  lastFor(work: string): string {
    return recall(`tool.${work}`) ?? '';
  }

  rememberFor(work: string, toolId: string): void {
    remember(`tool.${work}`, toolId);
  }
}
