import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatIconModule } from '@angular/material/icon';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { Router, RouterLink } from '@angular/router';
import { firstValueFrom } from 'rxjs';

import { type Shoot } from '#schemas/api/shoots';
import { Session } from '../account/session';
import { problemFrom } from '../http/problem';
import { ProblemNote } from '../ui/problem-note';
import { ShootDialog, type ShootDialogData } from './shoot-dialog';
import { ShootsApi } from './shoots-api';

/** What the crew is working on, with plates as pictures. */
@Component({
  selector: 'fl-shoots',
  imports: [DatePipe, MatButtonModule, MatIconModule, MatProgressBarModule, RouterLink, ProblemNote],
  templateUrl: './shoots.html',
  styleUrl: './shoots.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Shoots {
  readonly crewId = input.required<string>();

  readonly #session = inject(Session);
  readonly #dialog = inject(MatDialog);
  readonly #router = inject(Router);
  protected readonly shoots = inject(ShootsApi).shoots(this.crewId);
  protected readonly items = computed(() => (this.shoots.hasValue() ? this.shoots.value().items : []));
  protected readonly problem = computed(() => {
    const error = this.shoots.error();
    return error && problemFrom(error);
  });
  protected readonly maySee = computed(() => this.#session.may(this.crewId(), 'see'));
  protected readonly mayEdit = computed(() => this.#session.may(this.crewId(), 'edit'));

  protected async create(): Promise<void> {
    const data: ShootDialogData = { crewId: this.crewId() };
    const made = await firstValueFrom(
      this.#dialog.open<ShootDialog, ShootDialogData, Shoot>(ShootDialog, { data }).afterClosed(),
    );
    if (made) await this.#router.navigate(['/crews', this.crewId(), 'shoots', made.id]);
  }
}
