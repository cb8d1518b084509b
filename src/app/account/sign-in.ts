import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { Router } from '@angular/router';

import { type Problem, problemFrom } from '../http/problem';
import { Mark } from '../ui/mark';
import { ProblemNote } from '../ui/problem-note';
import { Session } from './session';

@Component({
  selector: 'fl-sign-in',
  imports: [
    ReactiveFormsModule,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatProgressBarModule,
    Mark,
    ProblemNote,
  ],
  templateUrl: './sign-in.html',
  styleUrl: './sign-in.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignIn {
  /** Where to go afterwards: a path of this application. */
  readonly then = input<string>();

  readonly #session = inject(Session);
  readonly #router = inject(Router);
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | undefined>(undefined);
  protected readonly form = new FormGroup({
    email: new FormControl('', { nonNullable: true, validators: [Validators.required, Validators.email] }),
    password: new FormControl('', { nonNullable: true, validators: Validators.required }),
  });

  protected async signIn(): Promise<void> {
    if (this.form.invalid || this.busy()) return this.form.markAllAsTouched();
    this.busy.set(true);
    this.problem.set(undefined);
    try {
      await this.#session.signIn(this.form.getRawValue());
      await this.#router.navigateByUrl(localPath(this.then()));
    } catch (error) {
      this.problem.set(problemFrom(error));
    } finally {
      this.busy.set(false);
    }
  }
}

/** Only our own pages: an address handed over in a link must not lead elsewhere. */
function localPath(path: string | undefined): string {
  return path?.startsWith('/') && !path.startsWith('//') ? path : '/';
}
