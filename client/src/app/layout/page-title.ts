import { inject, Injectable } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { TitleStrategy, type RouterStateSnapshot } from '@angular/router';

/** The window's title: the page, then the workbench. */
@Injectable({ providedIn: 'root' })
export class PageTitle extends TitleStrategy {
  private readonly title = inject(Title);

  override updateTitle(snapshot: RouterStateSnapshot): void {
    const page = this.buildTitle(snapshot);
    if (page !== undefined) this.name(page);
  }

  /** For pages whose name is known only when their thing has been read. */
  name(page: string): void {
    this.title.setTitle(`${page} · Second Spanner`);
  }
}
