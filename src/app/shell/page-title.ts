import { inject, Injectable } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { type RouterStateSnapshot, TitleStrategy } from '@angular/router';

/** "Shoots · Fairlead" in the browser's tab. */
@Injectable()
export class PageTitle extends TitleStrategy {
  readonly #title = inject(Title);

  override updateTitle(state: RouterStateSnapshot): void {
    const title = this.buildTitle(state);
    this.#title.setTitle(title ? `${title} · Fairlead` : 'Fairlead');
  }
}
