import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatIconModule } from '@angular/material/icon';
import { MatMenuModule } from '@angular/material/menu';
import { Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';

import { Session } from '../account/session';
import { Mark } from '../ui/mark';

/** The frame around every page but the designer: name, crew, where one can go, who one is. */
@Component({
  selector: 'fl-page-frame',
  imports: [MatButtonModule, MatIconModule, MatMenuModule, RouterLink, RouterLinkActive, RouterOutlet, Mark],
  templateUrl: './page-frame.html',
  styleUrl: './page-frame.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PageFrame {
  readonly crewId = input<string>();

  readonly #router = inject(Router);
  protected readonly session = inject(Session);
  protected readonly membership = computed(() => {
    const memberships = this.session.memberships();
    return memberships.find(each => each.crewId === this.crewId()) ?? memberships[0];
  });

  protected async signOut(): Promise<void> {
    await this.session.signOut();
    await this.#router.navigate(['/sign-in']);
  }
}
