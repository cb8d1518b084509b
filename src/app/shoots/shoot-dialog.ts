import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';

import { type Shoot } from '#schemas/api/shoots';
import { type Problem, problemFrom } from '../http/problem';
import { ProblemNote } from '../ui/problem-note';
import { ShootsApi } from './shoots-api';

export interface ShootDialogData {
  readonly crewId: string;
  /** The shoot to change; a new one where there is none. */
  readonly shoot?: Shoot;
}

/** Makes or changes a shoot; what was typed stays when the server refuses it. Closes with the shoot. */
@Component({
  selector: 'fl-shoot-dialog',
  imports: [
    ReactiveFormsModule,
    MatButtonModule,
    MatDialogModule,
    MatFormFieldModule,
    MatInputModule,
    ProblemNote,
  ],
  template: `
    <form [formGroup]="form" (ngSubmit)="save()">
      <h2 mat-dialog-title>{{ data.shoot ? 'Change shoot' : 'New shoot' }}</h2>
      <mat-dialog-content>
        <mat-form-field>
          <mat-label>Title</mat-label>
          <input matInput formControlName="title" maxlength="200" cdkFocusInitial />
          @if (form.controls.title.touched && form.controls.title.invalid) {
            <mat-error>A shoot needs a title</mat-error>
          }
        </mat-form-field>
        <mat-form-field>
          <mat-label>Place</mat-label>
          <input matInput formControlName="place" maxlength="200" />
        </mat-form-field>
        <mat-form-field>
          <mat-label>First day</mat-label>
          <input matInput type="date" formControlName="startsOn" />
        </mat-form-field>
        <mat-form-field>
          <mat-label>Notes</mat-label>
          <textarea matInput rows="4" formControlName="notes" maxlength="20000"></textarea>
        </mat-form-field>
        @if (problem(); as what) {
          <fl-problem-note [problem]="what" />
        }
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button matButton type="button" mat-dialog-close>Cancel</button>
        <button matButton="filled" type="submit" [disabled]="busy()">Save</button>
      </mat-dialog-actions>
    </form>
  `,
  styles: `
    mat-dialog-content {
      display: grid;
      gap: 0.875rem;
      width: min(30rem, 80vw);
      padding-top: 0.5rem !important;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ShootDialog {
  readonly #api = inject(ShootsApi);
  readonly #dialog = inject<MatDialogRef<ShootDialog, Shoot>>(MatDialogRef);
  protected readonly data = inject<ShootDialogData>(MAT_DIALOG_DATA);
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | undefined>(undefined);
  protected readonly form = new FormGroup({
    title: text(this.data.shoot?.title, Validators.pattern(/\S/)),
    place: text(this.data.shoot?.place),
    startsOn: text(this.data.shoot?.startsOn ?? ''),
    notes: text(this.data.shoot?.notes),
  });

  protected async save(): Promise<void> {
    if (this.form.invalid || this.busy()) return this.form.markAllAsTouched();
    const { startsOn, ...rest } = this.form.getRawValue();
    const draft = { ...rest, startsOn: startsOn || null };
    const { crewId, shoot } = this.data;
    this.busy.set(true);
    try {
      const saved = shoot
        ? await this.#api.changeShoot(crewId, shoot, draft)
        : await this.#api.createShoot(crewId, draft);
      this.#dialog.close(saved);
    } catch (error) {
      this.problem.set(problemFrom(error));
    } finally {
      this.busy.set(false);
    }
  }
}

function text(value = '', pattern?: ReturnType<typeof Validators.pattern>): FormControl<string> {
  return new FormControl(value, {
    nonNullable: true,
    validators: pattern ? [Validators.required, pattern] : [],
  });
}
