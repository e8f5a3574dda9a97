import { inject, Injectable } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { type RouterStateSnapshot, TitleStrategy } from '@angular/router';

/** Names the page in the browser's tab: "Receivers · Fallow". */
@Injectable()
export class PageTitle extends TitleStrategy {
  private readonly title = inject(Title);

  override updateTitle(state: RouterStateSnapshot): void {
    const page = this.buildTitle(state);
    this.title.setTitle(page === undefined ? 'Fallow' : `${page} · Fallow`);
  }
}
