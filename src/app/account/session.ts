import { HttpClient } from '@angular/common/http';
import { computed, inject, Injectable, signal } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { type Role, type Session as SessionBody, type SignIn } from '#schemas/api/session';
import { type Action, may } from './may';

const NOBODY: SessionBody = { user: null, memberships: [] };

/** Who is signed in, and what they may do in which crew. */
@Injectable({ providedIn: 'root' })
export class Session {
  readonly #http = inject(HttpClient);
  readonly #session = signal(NOBODY);

  readonly user = computed(() => this.#session().user);
  readonly memberships = computed(() => this.#session().memberships);

  /** Asks the server once at the start; where it cannot be reached nobody is signed in, and the page says why. */
  async load(): Promise<void> {
    try {
      this.#session.set(await firstValueFrom(this.#http.get<SessionBody>('/api/session')));
    } catch {
      this.#session.set(NOBODY);
    }
  }

  async signIn(who: SignIn): Promise<void> {
    this.#session.set(await firstValueFrom(this.#http.post<SessionBody>('/api/session', who)));
  }

  async signOut(): Promise<void> {
    await firstValueFrom(this.#http.delete('/api/session'));
    this.#session.set(NOBODY);
  }

  roleIn(crewId: string): Role | undefined {
    return this.memberships().find(membership => membership.crewId === crewId)?.role;
  }

  /** What a role may not do is not offered; the server decides in any case. */
  may(crewId: string, action: Action): boolean {
    const role = this.roleIn(crewId);
    return role !== undefined && may(role, action);
  }
}
