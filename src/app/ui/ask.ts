import { ChangeDetectionStrategy, Component, inject, Injectable } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialog, MatDialogModule } from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';

export interface Question {
  readonly title: string;
  /** What would happen, and what would be kept. */
  readonly detail: string;
  /** The button that does it, named for what it does. */
  readonly yes: string;
}

@Component({
  selector: 'fl-question',
  imports: [MatButtonModule, MatDialogModule],
  template: `
    <h2 mat-dialog-title>{{ question.title }}</h2>
    <mat-dialog-content>{{ question.detail }}</mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton [mat-dialog-close]="false" cdkFocusInitial>Keep it</button>
      <button matButton="filled" [mat-dialog-close]="true">{{ question.yes }}</button>
    </mat-dialog-actions>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class QuestionDialog {
  protected readonly question = inject<Question>(MAT_DIALOG_DATA);
}

/** Asks before something is done that a person would not want done by a slip. */
@Injectable({ providedIn: 'root' })
export class Ask {
  readonly #dialog = inject(MatDialog);

  async sure(data: Question): Promise<boolean> {
    const dialog = this.#dialog.open<QuestionDialog, Question, boolean>(QuestionDialog, {
      data,
      maxWidth: '28rem',
    });
    return (await firstValueFrom(dialog.afterClosed())) === true;
  }
}
