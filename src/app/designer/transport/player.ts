import { DestroyRef, inject, Injectable, signal } from '@angular/core';

import {
  deliveredFrameCount,
  deliveredOfSourceFrame,
  sourceFrameOfDelivered,
} from '#shared/time/delivered-time';
import { framesPerSecond } from '#shared/time/frame-rate';
import { DesignerSession } from '../session/designer-session';

/** Fastest shuttle, times the delivered rate. */
const FASTEST = 8;

/** Shift with an arrow steps this many delivered seconds. */
const JUMP_SEC = 0.5;

/** Plays the move at its delivered rate: frames are dropped rather than slowed down. */
@Injectable()
export class Player {
  readonly #session = inject(DesignerSession);
  /** 0 stands, 1 plays at the delivered rate, −2 runs back at twice of it. */
  readonly rate = signal(0);
  #request = 0;
  #startedMs = 0;
  #startedAt = 0;

  constructor() {
    inject(DestroyRef).onDestroy(() => this.stop());
  }

  toggle(): void {
    if (this.rate() === 0) this.#run(1);
    else this.stop();
  }

  stop(): void {
    cancelAnimationFrame(this.#request);
    this.rate.set(0);
  }

  /** J and L: starts, turns round, or doubles what is running. */
  shuttle(direction: 1 | -1): void {
    const rate = this.rate();
    const next = rate * direction > 0 ? Math.min(Math.abs(rate) * 2, FASTEST) * direction : direction;
    this.#run(next);
  }

  /** Steps by delivered frames, onto one. */
  step(frames: number): void {
    this.stop();
    const here = this.#delivered();
    const whole = frames > 0 ? Math.floor(here + 1e-9) : Math.ceil(here - 1e-9);
    this.#show(whole + frames);
  }

  jump(direction: 1 | -1): void {
    this.step(direction * Math.max(Math.round(JUMP_SEC * framesPerSecond(this.#session.times().rate)), 1));
  }

  toStart(): void {
    this.stop();
    this.#show(0);
  }

  toEnd(): void {
    this.stop();
    this.#show(this.#last());
  }

  #run(rate: number): void {
    cancelAnimationFrame(this.#request);
    this.#session.hand.set(undefined);
    const atEnd = rate > 0 ? this.#delivered() >= this.#last() : this.#delivered() <= 0;
    this.#startedAt = atEnd ? (rate > 0 ? 0 : this.#last()) : this.#delivered();
    this.#startedMs = performance.now();
    this.rate.set(rate);
    this.#request = requestAnimationFrame(now => this.#tick(now));
  }

  #tick(now: number): void {
    const seconds = Math.max(now - this.#startedMs, 0) / 1000;
    const frame = this.#startedAt + seconds * this.rate() * framesPerSecond(this.#session.times().rate);
    const over = frame > this.#last() || frame < 0;
    this.#show(Math.floor(frame + 1e-9));
    if (over) this.stop();
    else this.#request = requestAnimationFrame(later => this.#tick(later));
  }

  #delivered(): number {
    return deliveredOfSourceFrame(this.#session.times(), this.#session.playhead());
  }

  #last(): number {
    return deliveredFrameCount(this.#session.times()) - 1;
  }

  #show(delivered: number): void {
    const index = Math.min(Math.max(delivered, 0), this.#last());
    this.#session.seek(sourceFrameOfDelivered(this.#session.times(), index));
  }
}
