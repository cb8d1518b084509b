import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatIconModule } from '@angular/material/icon';
import { MatTooltipModule } from '@angular/material/tooltip';

import { deliveredFrameCount, deliveredOfSourceFrame, labelledFrame } from '#shared/time/delivered-time';
import { timecodeFromFrame } from '#shared/time/timecode';
import { DesignerSession } from '../session/designer-session';
import { keyAt, setKey } from '../state/commands';
import { Player } from './player';

/** Plays, steps, and says where the playhead is, in delivered frames and in the source's timecode. */
@Component({
  selector: 'fl-transport',
  imports: [MatButtonModule, MatIconModule, MatTooltipModule],
  template: `
    <button
      matIconButton
      (click)="player.toStart()"
      matTooltip="To the start (Home)"
      aria-label="To the start"
    >
      <mat-icon svgIcon="skip-back" />
    </button>
    <button
      matIconButton
      (click)="player.step(-1)"
      matTooltip="One frame back (←)"
      aria-label="One frame back"
    >
      <mat-icon svgIcon="step-back" />
    </button>
    <button
      matIconButton
      class="play"
      (click)="player.toggle()"
      matTooltip="Play or stop (Space)"
      [attr.aria-label]="playing() ? 'Stop' : 'Play'"
    >
      <mat-icon [svgIcon]="playing() ? 'pause' : 'play'" />
    </button>
    <button matIconButton (click)="player.step(1)" matTooltip="One frame on (→)" aria-label="One frame on">
      <mat-icon svgIcon="step-forward" />
    </button>
    <button matIconButton (click)="player.toEnd()" matTooltip="To the end (End)" aria-label="To the end">
      <mat-icon svgIcon="skip-forward" />
    </button>
    <output aria-label="Playhead" data-testid="playhead">
      <span class="frame"
        >{{ delivered() }}<small> / {{ last() }}</small></span
      >
      <span class="timecode" matTooltip="Source timecode">{{ timecode() }}</span>
    </output>
    @if (!session.readOnly()) {
      <button
        matButton
        (click)="setKeyHere()"
        [matTooltip]="onKey() ? 'Give this key the pose in hand (N)' : 'Set a key at the playhead (N)'"
      >
        <mat-icon svgIcon="key" />Set key
      </button>
    }
  `,
  styleUrl: './transport.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Transport {
  protected readonly session = inject(DesignerSession);
  protected readonly player = inject(Player);
  protected readonly playing = computed(() => this.player.rate() !== 0);
  protected readonly onKey = computed(() => this.session.keyHere() !== undefined);
  protected readonly last = computed(() => deliveredFrameCount(this.session.times()) - 1);
  protected readonly delivered = computed(() => {
    const frame = deliveredOfSourceFrame(this.session.times(), this.session.playhead());
    return Number.isInteger(frame) ? String(frame) : frame.toFixed(1);
  });
  protected readonly timecode = computed(() => {
    const { startFrame, count } = this.session.times();
    return timecodeFromFrame(startFrame + labelledFrame(this.session.playhead()), count);
  });

  setKeyHere(): void {
    setKeyAtPlayhead(this.session);
  }
}

/** Sets a key at the playhead with the pose in hand, else with the path's own pose there. */
export function setKeyAtPlayhead(session: DesignerSession): void {
  const frame = Math.round(session.playhead());
  const hand = session.hand();
  if (!hand && keyAt(session.move(), frame)) return session.goToKey(frame);
  if (session.run(setKey(frame, hand?.look ?? session.lookAt(frame)))) {
    session.hand.set(undefined);
    session.seek(frame);
  }
}
