import { ChangeDetectionStrategy, Component } from '@angular/core';

/** The product's mark: a line running smoothly through a fairlead. */
@Component({
  selector: 'fl-mark',
  template: `
    <svg viewBox="0 0 32 32" width="26" height="26" aria-hidden="true">
      <path d="M2 22 C10 22 10 13 16 13 S22 20 30 20" />
      <circle cx="16" cy="13" r="6" />
    </svg>
  `,
  styles: `
    :host {
      display: inline-flex;
    }

    svg {
      fill: none;
      stroke-width: 2.6;
      stroke-linecap: round;
    }

    path {
      stroke: currentColor;
    }

    circle {
      stroke: var(--mat-sys-tertiary);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Mark {}
