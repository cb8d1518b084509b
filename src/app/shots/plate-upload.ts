import { DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, input, output, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatIconModule } from '@angular/material/icon';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { type Subscription } from 'rxjs';

import { type Plate } from '#schemas/api/plates';
import { type Problem, problemFrom } from '../http/problem';
import { ProblemNote } from '../ui/problem-note';
import { ShotsApi } from './shots-api';

interface Running {
  readonly name: string;
  /** 0…1 of the bytes sent. */
  readonly sent: number;
}

/** Takes a picture by drop or choice and uploads it as a plate, with progress and cancel. */
@Component({
  selector: 'fl-plate-upload',
  imports: [DecimalPipe, MatButtonModule, MatIconModule, MatProgressBarModule, ProblemNote],
  template: `
    <label
      class="drop"
      [class.over]="over()"
      (dragover)="$event.preventDefault(); over.set(true)"
      (dragleave)="over.set(false)"
      (drop)="drop($event)"
    >
      <mat-icon svgIcon="picture-add" aria-hidden="true" />
      <span
        ><strong>Drop a panorama here, or choose one</strong><br />JPEG, PNG, WebP or TIFF · 2:1 · up to 80 MB
        and 12,000 × 6,000</span
      >
      <input
        #file
        class="fl-heard"
        type="file"
        accept="image/jpeg,image/png,image/webp,image/tiff"
        aria-label="Panorama to upload as a plate"
        [disabled]="running() !== undefined"
        (change)="choose(file.files); file.value = ''"
      />
    </label>
    @if (running(); as it) {
      <div class="running" role="status">
        <span
          >{{ it.name }}:
          {{
            it.sent < 1 ? (it.sent * 100 | number: '1.0-0') + ' % sent' : 'making the display versions'
          }}</span
        >
        <button matButton (click)="cancel()">Cancel</button>
        <mat-progress-bar
          [mode]="it.sent < 1 ? 'determinate' : 'indeterminate'"
          [value]="it.sent * 100"
          [attr.aria-label]="'Uploading ' + it.name"
        />
      </div>
    }
    @if (problem(); as what) {
      <fl-problem-note [problem]="what" />
    }
  `,
  styleUrl: './plate-upload.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlateUpload {
  readonly crewId = input.required<string>();
  readonly shotId = input.required<string>();
  /** The source frame at which the plate will stand. */
  readonly frame = input(0);
  readonly uploaded = output<Plate>();

  readonly #api = inject(ShotsApi);
  #upload: Subscription | undefined;
  protected readonly over = signal(false);
  protected readonly running = signal<Running | undefined>(undefined);
  protected readonly problem = signal<Problem | undefined>(undefined);

  protected drop(event: DragEvent): void {
    event.preventDefault();
    this.over.set(false);
    this.choose(event.dataTransfer?.files ?? null);
  }

  protected choose(files: FileList | null): void {
    const picture = files?.[0];
    if (!picture || this.running()) return;
    this.problem.set(undefined);
    this.running.set({ name: picture.name, sent: 0 });
    this.#upload = this.#api.uploadPlate(this.crewId(), this.shotId(), picture, this.frame()).subscribe({
      next: ({ sent, plate }) => {
        this.running.set({ name: picture.name, sent });
        if (plate) this.uploaded.emit(plate);
      },
      error: (error: unknown) => {
        this.problem.set(problemFrom(error));
        this.running.set(undefined);
      },
      complete: () => this.running.set(undefined),
    });
  }

  protected cancel(): void {
    this.#upload?.unsubscribe();
    this.running.set(undefined);
  }
}
