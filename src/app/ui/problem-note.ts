import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatIconModule } from '@angular/material/icon';

import { type Problem } from '../http/problem';

/** What went wrong, where it happened: title, what was kept and what to do, and each fault with its place. */
@Component({
  selector: 'fl-problem-note',
  imports: [MatButtonModule, MatIconModule],
  template: `
    <mat-icon svgIcon="alert" aria-hidden="true" />
    <div>
      <strong>{{ problem().title }}</strong>
      <p>{{ problem().detail }}</p>
      @if (problem().errors.length > 0) {
        <ul>
          @for (error of problem().errors.slice(0, 12); track $index) {
            <li>
              @if (error.pointer) {
                <code>{{ error.pointer }}</code>
              }
              {{ error.detail }}
            </li>
          }
          @if (problem().errors.length > 12) {
            <li>and {{ problem().errors.length - 12 }} more</li>
          }
        </ul>
      }
      @if (retryLabel(); as label) {
        <button matButton (click)="retry.emit()">{{ label }}</button>
      }
    </div>
  `,
  styles: `
    :host {
      display: flex;
      gap: 0.75rem;
      padding: 0.75rem 1rem;
      border-left: 3px solid var(--mat-sys-error);
      background: var(--mat-sys-error-container);
      color: var(--mat-sys-on-error-container);
      overflow-wrap: anywhere;
    }

    mat-icon {
      flex: none;
    }

    p,
    ul {
      margin: 0.25rem 0 0;
    }

    ul {
      padding-left: 1.1rem;
    }
  `,
  host: { role: 'alert' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProblemNote {
  readonly problem = input.required<Problem>();
  /** A button to try again, when this says what it is called. */
  readonly retryLabel = input<string>();
  readonly retry = output();
}
