import { Injectable, inject } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { type RouterStateSnapshot, TitleStrategy } from '@angular/router';

/** Names the browser's tab after the page first, since tabs are cut off at the end. */
@Injectable()
export class PageTitle extends TitleStrategy {
  private readonly title = inject(Title);

  override updateTitle(snapshot: RouterStateSnapshot): void {
    this.name(this.buildTitle(snapshot));
  }

  /** For a page whose name is known only once its data is there. */
  name(page: string | undefined): void {
    this.title.setTitle(page ? `${page} · Bolewright` : 'Bolewright');
  }
}
