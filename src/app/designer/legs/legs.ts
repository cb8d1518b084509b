import {
  ChangeDetectionStrategy,
  Component,
  computed,
  type ElementRef,
  inject,
  viewChild,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatTooltipModule } from '@angular/material/tooltip';

import { type Key, type Leg } from '#schemas/move';
import { CROSSING_LIMIT_SEC } from '#shared/measure/limits';
import { deliveredFrameCount, deliveredSeconds } from '#shared/time/delivered-time';
import { coursePoints } from '../pace';
import { DesignerSession } from '../session/designer-session';
import { retimeKey } from '../state/commands';
import { Player } from '../transport/player';
import { easePath } from './ease-curve';

const PACE_POINTS = 320;

/** Where the crew's limit is drawn in the pace strip, from its bottom: faster goes above. */
const LIMIT_HEIGHT = 0.6;

interface Post {
  readonly frame: number;
  readonly number: number;
  readonly left: number;
  readonly selected: boolean;
  readonly rest: boolean;
  readonly name: string;
}

interface Block {
  readonly frame: number;
  readonly left: number;
  readonly width: number;
  readonly curve: string;
  readonly travel: string;
  readonly turns: string;
  readonly selected: boolean;
  readonly name: string;
}

/** The legs in time: a post at each key, a block between two posts that says how the camera travels, and its pace. */
@Component({
  selector: 'fl-legs',
  imports: [MatButtonModule, MatTooltipModule],
  templateUrl: './legs.html',
  styleUrl: './legs.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Legs {
  protected readonly session = inject(DesignerSession);
  readonly #player = inject(Player);
  protected readonly trackElement = viewChild.required<ElementRef<HTMLElement>>('track');

  /** The stretch of source frames that the band shows: the delivered range, and keys outside it. */
  readonly #span = computed(() => {
    const { keys } = this.session.move();
    const { from, to } = this.session.times();
    const first = Math.min(from, keys[0].frame);
    return { first, length: Math.max(to, keys[keys.length - 1].frame, first + 1) - first };
  });
  protected readonly playheadLeft = computed(() => this.#percent(this.session.playhead()));
  protected readonly posts = computed((): Post[] => {
    const selected = this.session.selection().keys;
    return this.session.move().keys.map(({ frame, rest }, i) => ({
      frame,
      number: i + 1,
      left: this.#percent(frame),
      selected: selected.includes(frame),
      rest: rest === true,
      name: `Key ${i + 1}, frame ${frame}, ${this.#seconds(frame)}${rest ? ', at rest' : ''}`,
    }));
  });
  protected readonly blocks = computed((): Block[] => {
    const { keys } = this.session.move();
    return keys.slice(0, -1).map((key, i) => this.#block(key, keys[i + 1]));
  });
  protected readonly ticks = computed(() => this.#ticks());
  /** The pace strip in a box of PACE_POINTS × 100: an area whose height is the pan rate against the limit. */
  protected readonly paceArea = computed(() => {
    const points = coursePoints(this.session.compiled(), this.session.times(), PACE_POINTS).map(
      ({ frame, pace }) => {
        const height = Math.min(pace * LIMIT_HEIGHT, 1);
        return `${(this.#percent(frame) * 10).toFixed(1)} ${(100 - 100 * height).toFixed(1)}`;
      },
    );
    const [first, last] = [points[0].split(' ')[0], points[points.length - 1].split(' ')[0]];
    return `M${first} 100L${points.join('L')}L${last} 100Z`;
  });
  protected readonly limitY = 100 - 100 * LIMIT_HEIGHT;
  protected readonly limitText = `crossing in ${CROSSING_LIMIT_SEC} s`;

  protected scrub(event: PointerEvent): void {
    if (event.type === 'pointerdown') this.trackElement().nativeElement.setPointerCapture(event.pointerId);
    if (!this.trackElement().nativeElement.hasPointerCapture(event.pointerId)) return;
    this.#player.stop();
    this.session.seek(Math.round(this.#frameAt(event)));
  }

  protected takePost(event: PointerEvent, post: Post): void {
    event.stopPropagation();
    if (!(event.currentTarget instanceof HTMLElement)) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    this.#dragged = post.frame;
    this.session.goToKey(post.frame);
  }

  #dragged: number | undefined;

  protected dragPost(event: PointerEvent): void {
    if (this.#dragged === undefined) return;
    this.session.preview(retimeKey(this.#dragged, this.#frameAt(event)));
    const [frame] = this.session.selection().keys;
    this.session.seek(frame ?? this.#dragged);
  }

  protected dropPost(): void {
    this.#dragged = undefined;
    this.session.commit();
  }

  /** Alt with an arrow moves the key in time; with Shift by ten frames. Arrows alone step the playhead. */
  protected nudgePost(event: KeyboardEvent, post: Post): void {
    const direction = event.key === 'ArrowLeft' ? -1 : event.key === 'ArrowRight' ? 1 : 0;
    if (direction === 0 || !event.altKey) return;
    event.preventDefault();
    event.stopPropagation();
    const step = direction * (event.shiftKey ? 10 : 1);
    if (this.session.run(retimeKey(post.frame, post.frame + step))) {
      this.session.seek(this.session.selection().keys[0] ?? post.frame);
    }
  }

  protected goToKey(post: Post): void {
    this.session.goToKey(post.frame);
  }

  protected takeLeg(block: Block): void {
    this.session.select({ keys: [], leg: block.frame });
  }

  #block(key: Key, next: Key): Block {
    const leg: Leg = key.leg ?? { path: 'level', ease: 'linear' };
    const ease = typeof leg.ease === 'object' ? 'own curve' : leg.ease;
    const travel = leg.ease === 'hold' ? 'hold' : `${leg.path}, ${ease}`;
    const turns = Math.trunc((next.yaw - key.yaw) / 360);
    const left = this.#percent(key.frame);
    return {
      frame: key.frame,
      left,
      width: this.#percent(next.frame) - left,
      curve: easePath(leg.ease, key.rest === true, next.rest === true),
      travel,
      turns:
        turns === 0
          ? ''
          : `${Math.abs(turns)} ${Math.abs(turns) === 1 ? 'turn' : 'turns'} ${turns > 0 ? 'right' : 'left'}`,
      selected: this.session.selection().leg === key.frame,
      name: `Leg from frame ${key.frame} to ${next.frame}: ${travel}`,
    };
  }

  #percent(frame: number): number {
    const { first, length } = this.#span();
    return ((frame - first) / length) * 100;
  }

  #frameAt(event: PointerEvent): number {
    const { left, width } = this.trackElement().nativeElement.getBoundingClientRect();
    const { first, length } = this.#span();
    return first + ((event.clientX - left) / width) * length;
  }

  #seconds(frame: number): string {
    return `${deliveredSeconds(this.session.times(), frame).toFixed(2)} s`;
  }

  /** Delivered seconds, at a spacing that leaves room for their labels. */
  #ticks(): { readonly left: number; readonly text: string }[] {
    const times = this.session.times();
    const total = deliveredSeconds(times, times.from + deliveredFrameCount(times) * times.speed);
    const every =
      [0.25, 0.5, 1, 2, 5, 10, 15, 30, 60, 120, 300, 600].find(step => total / step <= 14) ?? 1800;
    const framesPerSecond = (times.rate.num * times.speed) / times.rate.den;
    return Array.from({ length: Math.floor(total / every) + 1 }, (_, i) => ({
      left: this.#percent(times.from + i * every * framesPerSecond),
      text: every < 1 ? (i * every).toFixed(2) : clock(i * every),
    })).filter(({ left }) => left <= 100);
  }
}

function clock(seconds: number): string {
  return seconds < 60
    ? `${seconds} s`
    : `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`;
}
