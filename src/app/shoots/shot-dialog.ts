import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatCheckboxModule } from '@angular/material/checkbox';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';

import { type Shot } from '#schemas/api/shots';
import { type Problem, problemFrom } from '../http/problem';
import { ProblemNote } from '../ui/problem-note';
import { NAMED_RATES } from './frame-rates';
import { ShootsApi } from './shoots-api';
import { draftOf, shotForm } from './shot-form';

export interface ShotDialogData {
  readonly crewId: string;
  readonly shootId: string;
  /** The shot to change; a new one where there is none. */
  readonly shot?: Shot;
}

/** Makes or changes a shot's settings; closes with the shot. */
@Component({
  selector: 'fl-shot-dialog',
  imports: [
    ReactiveFormsModule,
    MatButtonModule,
    MatCheckboxModule,
    MatDialogModule,
    MatFormFieldModule,
    MatInputModule,
    MatSelectModule,
    ProblemNote,
  ],
  templateUrl: './shot-dialog.html',
  styleUrl: './shot-dialog.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ShotDialog {
  readonly #api = inject(ShootsApi);
  readonly #dialog = inject<MatDialogRef<ShotDialog, Shot>>(MatDialogRef);
  protected readonly data = inject<ShotDialogData>(MAT_DIALOG_DATA);
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | undefined>(undefined);
  protected readonly form = shotForm(this.data.shot);
  protected readonly rates = [
    ...new Set([...NAMED_RATES.map(each => each.name), this.form.controls.rate.value]),
  ];

  constructor() {
    const { frames, to } = this.form.controls;
    // While the whole shot is delivered, its end goes with its length.
    let length = frames.value;
    frames.valueChanges.subscribe(value => {
      if (to.value === length - 1 && value >= 1) to.setValue(value - 1);
      length = value;
    });
  }

  protected wrong(name: keyof typeof this.form.controls): boolean {
    const control = this.form.controls[name];
    return control.touched && control.invalid;
  }

  protected groupFault(): string | undefined {
    const faults: Record<string, unknown> = this.form.errors ?? {};
    return Object.values(faults).map(String)[0];
  }

  protected async save(): Promise<void> {
    if (this.form.invalid || this.busy()) return this.form.markAllAsTouched();
    const { crewId, shootId, shot } = this.data;
    this.busy.set(true);
    try {
      const draft = draftOf(this.form);
      const saved = shot
        ? await this.#api.changeShot(crewId, shot, draft)
        : await this.#api.createShot(crewId, shootId, draft);
      this.#dialog.close(saved);
    } catch (error) {
      this.problem.set(problemFrom(error));
    } finally {
      this.busy.set(false);
    }
  }
}
