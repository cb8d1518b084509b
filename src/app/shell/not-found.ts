import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';

@Component({
  selector: 'fl-not-found',
  imports: [RouterLink],
  template: `
    <main class="fl-page">
      <section class="fl-empty">
        <h1>There is nothing at this address</h1>
        <p>It may have been deleted, or the link is cut short. Nothing of yours was changed.</p>
        <a routerLink="/">Go to the shoots</a>
      </section>
    </main>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotFound {}
