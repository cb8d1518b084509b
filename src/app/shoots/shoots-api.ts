import { HttpClient, httpResource } from '@angular/common/http';
import { inject, Injectable, type Signal } from '@angular/core';
import { firstValueFrom } from 'rxjs';

import { type Shoot, type ShootChanges, type ShootDraft, type ShootPage } from '#schemas/api/shoots';
import { type Shot, type ShotChanges, type ShotDraft, type ShotPage } from '#schemas/api/shots';

/** Shots on one page of a list: the server's most. */
const PAGE = 200;

/** Reads and writes of shoots and their shots. */
@Injectable({ providedIn: 'root' })
export class ShootsApi {
  readonly #http = inject(HttpClient);

  shoots(crewId: Signal<string>) {
    return httpResource<ShootPage>(() => `${crewPath(crewId())}/shoots?limit=${PAGE}`);
  }

  shoot(crewId: Signal<string>, shootId: Signal<string>) {
    return httpResource<Shoot>(() => `${crewPath(crewId())}/shoots/${shootId()}`);
  }

  shots(crewId: Signal<string>, shootId: Signal<string>) {
    return httpResource<ShotPage>(() => `${crewPath(crewId())}/shoots/${shootId()}/shots?limit=${PAGE}`);
  }

  createShoot(crewId: string, draft: ShootDraft): Promise<Shoot> {
    return firstValueFrom(this.#http.post<Shoot>(`${crewPath(crewId)}/shoots`, draft));
  }

  changeShoot(crewId: string, { id, revision }: Shoot, changes: ShootChanges): Promise<Shoot> {
    return firstValueFrom(
      this.#http.patch<Shoot>(`${crewPath(crewId)}/shoots/${id}`, changes, { headers: ifMatch(revision) }),
    );
  }

  deleteShoot(crewId: string, shootId: string): Promise<unknown> {
    return firstValueFrom(this.#http.delete(`${crewPath(crewId)}/shoots/${shootId}`));
  }

  createShot(crewId: string, shootId: string, draft: ShotDraft): Promise<Shot> {
    return firstValueFrom(this.#http.post<Shot>(`${crewPath(crewId)}/shoots/${shootId}/shots`, draft));
  }

  changeShot(crewId: string, { id, revision }: Shot, changes: ShotChanges): Promise<Shot> {
    return firstValueFrom(
      this.#http.patch<Shot>(`${crewPath(crewId)}/shots/${id}`, changes, { headers: ifMatch(revision) }),
    );
  }

  deleteShot(crewId: string, shotId: string): Promise<unknown> {
    return firstValueFrom(this.#http.delete(`${crewPath(crewId)}/shots/${shotId}`));
  }
}

export function crewPath(crewId: string): string {
  return `/api/crews/${crewId}`;
}

/** The revision that a change was made to: the server refuses it when somebody else was faster. */
export function ifMatch(revision: number): Record<string, string> {
  return { 'If-Match': `"${revision}"` };
}
