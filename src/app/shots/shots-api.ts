import { HttpClient, HttpEventType, httpResource } from '@angular/common/http';
import { inject, Injectable, type Signal } from '@angular/core';
import { filter, firstValueFrom, map, type Observable } from 'rxjs';

import { type Move, type MoveDraft, type MoveList } from '#schemas/api/moves';
import { type Plate, type PlateList } from '#schemas/api/plates';
import { type Shot } from '#schemas/api/shots';
import { type MoveDocument } from '#schemas/move';
import { crewPath, ifMatch } from '../shoots/shoots-api';

/** How far an upload is; `plate` when it is done. */
export interface UploadState {
  /** 0…1 of the bytes sent; at 1 the server makes the display versions. */
  readonly sent: number;
  readonly plate?: Plate;
}

/** Reads and writes of a shot's plates and moves. */
@Injectable({ providedIn: 'root' })
export class ShotsApi {
  readonly #http = inject(HttpClient);

  shot(crewId: Signal<string>, shotId: Signal<string>) {
    return httpResource<Shot>(() => `${crewPath(crewId())}/shots/${shotId()}`);
  }

  plates(crewId: Signal<string>, shotId: Signal<string>) {
    return httpResource<PlateList>(() => `${crewPath(crewId())}/shots/${shotId()}/plates`);
  }

  moves(crewId: Signal<string>, shotId: Signal<string>) {
    return httpResource<MoveList>(() => `${crewPath(crewId())}/shots/${shotId()}/moves`);
  }

  getShot(crewId: string, shotId: string): Promise<Shot> {
    return firstValueFrom(this.#http.get<Shot>(`${crewPath(crewId)}/shots/${shotId}`));
  }

  async getPlates(crewId: string, shotId: string): Promise<Plate[]> {
    return (await firstValueFrom(this.#http.get<PlateList>(`${crewPath(crewId)}/shots/${shotId}/plates`)))
      .items;
  }

  /** Uploads a plate; unsubscribing cancels it, and the server keeps nothing. */
  uploadPlate(crewId: string, shotId: string, picture: File, frame: number): Observable<UploadState> {
    const body = new FormData();
    body.set('frame', String(frame));
    body.set('picture', picture, picture.name);
    return this.#http
      .post<Plate>(`${crewPath(crewId)}/shots/${shotId}/plates`, body, {
        reportProgress: true,
        observe: 'events',
      })
      .pipe(
        map((event): UploadState | undefined => {
          if (event.type === HttpEventType.UploadProgress)
            return { sent: event.loaded / (event.total ?? event.loaded) };
          return event.type === HttpEventType.Response && event.body
            ? { sent: 1, plate: event.body }
            : undefined;
        }),
        filter(state => state !== undefined),
      );
  }

  deletePlate(crewId: string, plateId: string): Promise<unknown> {
    return firstValueFrom(this.#http.delete(`${crewPath(crewId)}/plates/${plateId}`));
  }

  createMove(crewId: string, shotId: string, draft: MoveDraft): Promise<Move> {
    return firstValueFrom(this.#http.post<Move>(`${crewPath(crewId)}/shots/${shotId}/moves`, draft));
  }

  getMove(crewId: string, moveId: string): Promise<Move> {
    return firstValueFrom(this.#http.get<Move>(`${crewPath(crewId)}/moves/${moveId}`));
  }

  /** @throws Problem of status 412, its `current` the stored move, where somebody else has saved meanwhile */
  saveMove(crewId: string, moveId: string, revision: number, document: MoveDocument): Promise<Move> {
    const body = { document };
    return firstValueFrom(
      this.#http.put<Move>(`${crewPath(crewId)}/moves/${moveId}`, body, { headers: ifMatch(revision) }),
    );
  }

  deleteMove(crewId: string, moveId: string): Promise<unknown> {
    return firstValueFrom(this.#http.delete(`${crewPath(crewId)}/moves/${moveId}`));
  }
}
