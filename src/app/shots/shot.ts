import { DatePipe, DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatIconModule } from '@angular/material/icon';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { MatTooltipModule } from '@angular/material/tooltip';
import { Router, RouterLink } from '@angular/router';
import { firstValueFrom } from 'rxjs';

import { type MoveDraft, type MoveSummary } from '#schemas/api/moves';
import { type Plate } from '#schemas/api/plates';
import { type Shot } from '#schemas/api/shots';
import { Session } from '../account/session';
import { Problem, problemFrom } from '../http/problem';
import { ShootsApi } from '../shoots/shoots-api';
import { ShotDialog, type ShotDialogData } from '../shoots/shot-dialog';
import { Ask } from '../ui/ask';
import { ProblemNote } from '../ui/problem-note';
import { moveOnShot } from './move-on-shot';
import { PlateUpload } from './plate-upload';
import { shotFacts } from './shot-facts';
import { ShotsApi } from './shots-api';

/** One shot: its settings, its plates, and the moves designed on it. */
@Component({
  selector: 'fl-shot',
  imports: [
    DatePipe,
    DecimalPipe,
    MatButtonModule,
    MatIconModule,
    MatProgressBarModule,
    MatTooltipModule,
    RouterLink,
    PlateUpload,
    ProblemNote,
  ],
  templateUrl: './shot.html',
  styleUrl: './shot.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ShotPage {
  readonly crewId = input.required<string>();
  readonly shotId = input.required<string>();

  readonly #api = inject(ShotsApi);
  readonly #shootsApi = inject(ShootsApi);
  readonly #session = inject(Session);
  readonly #dialog = inject(MatDialog);
  readonly #router = inject(Router);
  readonly #ask = inject(Ask);
  protected readonly shot = this.#api.shot(this.crewId, this.shotId);
  protected readonly plates = this.#api.plates(this.crewId, this.shotId);
  protected readonly moves = this.#api.moves(this.crewId, this.shotId);
  protected readonly plateItems = computed(() => (this.plates.hasValue() ? this.plates.value().items : []));
  protected readonly moveItems = computed(() => (this.moves.hasValue() ? this.moves.value().items : []));
  protected readonly facts = computed(() => (this.shot.hasValue() ? shotFacts(this.shot.value()) : []));
  protected readonly mayEdit = computed(() => this.#session.may(this.crewId(), 'edit'));
  protected readonly mayDelete = computed(() => this.#session.may(this.crewId(), 'delete'));
  protected readonly failed = signal<Problem | undefined>(undefined);
  protected readonly problem = computed(() => {
    const error = this.shot.error() ?? this.plates.error() ?? this.moves.error();
    return this.failed() ?? (error && problemFrom(error));
  });

  protected thumb(plate: Plate): string {
    return (plate.versions.find(version => version.name === '2048') ?? plate.versions[0]).url;
  }

  protected downloadPath(move: MoveSummary, file: string): string {
    return `/api/crews/${this.crewId()}/moves/${move.id}/${file}`;
  }

  protected async change(shot: Shot): Promise<void> {
    const data: ShotDialogData = { crewId: this.crewId(), shootId: shot.shootId, shot };
    const changed = await firstValueFrom(
      this.#dialog
        .open<ShotDialog, ShotDialogData, Shot>(ShotDialog, { data, maxWidth: '94vw' })
        .afterClosed(),
    );
    if (changed) this.shot.reload();
  }

  protected newMove(): Promise<void> {
    return this.#make({ title: 'New move' });
  }

  /** A document from elsewhere becomes a move of this shot; a bad one is listed fault by fault and nothing is made. */
  protected async openFile(files: FileList | null, shot: Shot): Promise<void> {
    const file = files?.[0];
    if (!file) return;
    const checked = moveOnShot(await file.text(), shot);
    if (checked.ok) return this.#make({ document: checked.document });
    const title = `${file.name} cannot be opened on this shot.`;
    this.failed.set(
      new Problem('invalid-file', title, 0, 'Nothing was made. What is wrong with it:', checked.faults),
    );
  }

  protected async removeMove(move: MoveSummary): Promise<void> {
    const detail = 'It can be brought back for 30 days.';
    if (!(await this.#ask.sure({ title: `Delete “${move.title}”?`, detail, yes: 'Delete move' }))) return;
    await this.#attempt(() => this.#api.deleteMove(this.crewId(), move.id));
    this.moves.reload();
  }

  protected async removePlate(plate: Plate): Promise<void> {
    const detail = 'The moves of this shot stay as they are. It can be brought back for 30 days.';
    if (!(await this.#ask.sure({ title: `Delete ${plate.fileName}?`, detail, yes: 'Delete plate' }))) return;
    await this.#attempt(() => this.#api.deletePlate(this.crewId(), plate.id));
    this.plates.reload();
  }

  protected async removeShot(shot: Shot): Promise<void> {
    const detail = 'Its plates and moves go with it. It can be brought back for 30 days.';
    if (!(await this.#ask.sure({ title: `Delete “${shot.title}”?`, detail, yes: 'Delete shot' }))) return;
    const gone = await this.#attempt(() => this.#shootsApi.deleteShot(this.crewId(), shot.id));
    if (gone) await this.#router.navigate(['/crews', this.crewId(), 'shoots', shot.shootId]);
  }

  async #make(draft: MoveDraft): Promise<void> {
    await this.#attempt(async () => {
      const move = await this.#api.createMove(this.crewId(), this.shotId(), draft);
      await this.#router.navigate(['/crews', this.crewId(), 'moves', move.id]);
    });
  }

  async #attempt(work: () => Promise<unknown>): Promise<boolean> {
    this.failed.set(undefined);
    try {
      await work();
      return true;
    } catch (error) {
      this.failed.set(problemFrom(error));
      return false;
    }
  }
}
