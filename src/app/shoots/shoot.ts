import { DatePipe, DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatDialog } from '@angular/material/dialog';
import { MatIconModule } from '@angular/material/icon';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { Router, RouterLink } from '@angular/router';
import { firstValueFrom } from 'rxjs';

import { type Shoot } from '#schemas/api/shoots';
import { type Shot } from '#schemas/api/shots';
import { deliveredFrameCount } from '#shared/time/delivered-time';
import { framesPerSecond } from '#shared/time/frame-rate';
import { Session } from '../account/session';
import { type Problem, problemFrom } from '../http/problem';
import { Ask } from '../ui/ask';
import { ProblemNote } from '../ui/problem-note';
import { nameOfRate } from './frame-rates';
import { ShootDialog, type ShootDialogData } from './shoot-dialog';
import { ShootsApi } from './shoots-api';
import { ShotDialog, type ShotDialogData } from './shot-dialog';

/** One shoot: its shots as a table and as pictures. */
@Component({
  selector: 'fl-shoot',
  imports: [
    DatePipe,
    DecimalPipe,
    MatButtonModule,
    MatButtonToggleModule,
    MatIconModule,
    MatProgressBarModule,
    RouterLink,
    ProblemNote,
  ],
  templateUrl: './shoot.html',
  styleUrl: './shoot.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ShootPage {
  readonly crewId = input.required<string>();
  readonly shootId = input.required<string>();

  readonly #api = inject(ShootsApi);
  readonly #session = inject(Session);
  readonly #dialog = inject(MatDialog);
  readonly #router = inject(Router);
  readonly #ask = inject(Ask);
  protected readonly view = signal<'table' | 'pictures'>('table');
  protected readonly shoot = this.#api.shoot(this.crewId, this.shootId);
  protected readonly shots = this.#api.shots(this.crewId, this.shootId);
  protected readonly items = computed(() => (this.shots.hasValue() ? this.shots.value().items : []));
  protected readonly failed = signal<Problem | undefined>(undefined);
  protected readonly problem = computed(() => {
    const error = this.shoot.error() ?? this.shots.error();
    return this.failed() ?? (error && problemFrom(error));
  });
  protected readonly mayEdit = computed(() => this.#session.may(this.crewId(), 'edit'));
  protected readonly mayDelete = computed(() => this.#session.may(this.crewId(), 'delete'));
  protected readonly deliveredTotal = computed(() =>
    this.items().reduce((sum, shot) => sum + this.seconds(shot), 0),
  );
  protected readonly moveTotal = computed(() => this.items().reduce((sum, shot) => sum + shot.moveCount, 0));

  protected rate(shot: Shot): string {
    return nameOfRate(shot.rate, shot.dropFrame);
  }

  /** Delivered length. */
  protected seconds(shot: Shot): number {
    return deliveredFrameCount(shot) / framesPerSecond(shot.rate);
  }

  protected async createShot(): Promise<void> {
    const data: ShotDialogData = { crewId: this.crewId(), shootId: this.shootId() };
    const made = await firstValueFrom(
      this.#dialog
        .open<ShotDialog, ShotDialogData, Shot>(ShotDialog, { data, maxWidth: '94vw' })
        .afterClosed(),
    );
    if (made) await this.#router.navigate(['/crews', this.crewId(), 'shots', made.id]);
  }

  protected async change(shoot: Shoot): Promise<void> {
    const data: ShootDialogData = { crewId: this.crewId(), shoot };
    const changed = await firstValueFrom(
      this.#dialog.open<ShootDialog, ShootDialogData, Shoot>(ShootDialog, { data }).afterClosed(),
    );
    if (changed) this.shoot.reload();
  }

  protected async remove(shoot: Shoot): Promise<void> {
    const sure = await this.#ask.sure({
      title: `Delete “${shoot.title}”?`,
      detail: 'Its shots, plates and moves go with it. It can be brought back for 30 days.',
      yes: 'Delete shoot',
    });
    if (!sure) return;
    try {
      await this.#api.deleteShoot(this.crewId(), shoot.id);
      await this.#router.navigate(['/crews', this.crewId(), 'shoots']);
    } catch (error) {
      this.failed.set(problemFrom(error));
    }
  }
}
