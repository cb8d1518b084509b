import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatCheckboxModule } from '@angular/material/checkbox';
import { MatIconModule } from '@angular/material/icon';
import { MatTooltipModule } from '@angular/material/tooltip';

import { type Ease, type Key, type Leg } from '#schemas/move';
import { DEG_PER_RAD } from '#shared/conventions';
import { bezierHandles } from '#shared/path/ease';
import { maxFovRad } from '#shared/projection/field-of-view';
import { deliveredSeconds } from '#shared/time/delivered-time';
import { timecodeFromFrame } from '#shared/time/timecode';
import { DesignerSession } from '../session/designer-session';
import { changeKey, changeLeg, type Look, removeSelectedKeys, retimeKey } from '../state/commands';
import { NumberField } from './number-field';

type Numeric = keyof Look;

interface NumberRow {
  readonly name: Numeric;
  readonly label: string;
  readonly unit: string;
  readonly step: number;
  readonly min: number;
  readonly max: number;
  readonly digits: number;
}

/** Widest yaw and roll of a document, degrees. */
const TURNS_LIMIT = 36_000;

/** Eases by the word that a document uses, and by the word that a person reads. */
const EASES: readonly { readonly ease: Exclude<Ease, object>; readonly name: string }[] = [
  { ease: 'fair', name: 'fair' },
  { ease: 'linear', name: 'linear' },
  { ease: 'ease', name: 'ease' },
  { ease: 'ease-in', name: 'ease in' },
  { ease: 'ease-out', name: 'ease out' },
  { ease: 'ease-in-out', name: 'ease in and out' },
  { ease: 'hold', name: 'hold' },
];

/** What an own curve starts from. */
const FIRST_CURVE: [number, number, number, number] = [0.42, 0, 0.58, 1];

/** The key or leg in hand, its numbers typed or nudged. */
@Component({
  selector: 'fl-hand',
  imports: [MatButtonModule, MatCheckboxModule, MatIconModule, MatTooltipModule, NumberField],
  templateUrl: './hand.html',
  styleUrl: './hand.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Hand {
  protected readonly session = inject(DesignerSession);
  protected readonly eases = EASES;
  protected readonly remove = removeSelectedKeys;
  protected readonly key = this.session.selectedKey;
  protected readonly legKey = this.session.selectedLeg;
  protected readonly keyNumber = computed(() => this.#numberOf(this.key()));
  protected readonly legNumber = computed(() => this.#numberOf(this.legKey()));
  protected readonly handles = computed(() => {
    const ease = this.legKey()?.leg?.ease;
    return ease === undefined ? undefined : typeof ease === 'object' ? bezierHandles(ease) : undefined;
  });
  protected readonly handleNames = ['x1', 'y1', 'x2', 'y2'] as const;
  protected readonly keyTime = computed(() => {
    const key = this.key();
    if (!key) return '';
    const times = this.session.times();
    return `${timecodeFromFrame(times.startFrame + key.frame, times.count)} source · ${deliveredSeconds(times, key.frame).toFixed(2)} s delivered`;
  });
  protected readonly rows = computed((): NumberRow[] => {
    const eye = this.key()?.eye ?? 0;
    const widest = Math.round(maxFovRad(eye) * DEG_PER_RAD * 1e4) / 1e4;
    return [
      { name: 'yaw', label: 'Yaw', unit: '°', step: 1, min: -TURNS_LIMIT, max: TURNS_LIMIT, digits: 2 },
      { name: 'pitch', label: 'Pitch', unit: '°', step: 1, min: -90, max: 90, digits: 2 },
      { name: 'roll', label: 'Roll', unit: '°', step: 1, min: -TURNS_LIMIT, max: TURNS_LIMIT, digits: 2 },
      { name: 'fov', label: 'Field of view', unit: '°', step: 1, min: 10, max: widest, digits: 2 },
      { name: 'eye', label: 'Eye point', unit: '', step: 0.05, min: 0, max: 1, digits: 3 },
    ];
  });

  protected type(key: Key, row: NumberRow, value: number): void {
    this.session.run(
      changeKey(key.frame, this.#change(key, row.name, value), `Change ${row.label.toLowerCase()}`),
    );
  }

  protected nudge(key: Key, row: NumberRow, value: number): void {
    const label = `Nudge ${row.label.toLowerCase()}`;
    this.session.run(
      changeKey(key.frame, this.#change(key, row.name, value), label, `${row.name} ${key.frame}`),
    );
  }

  protected retime(key: Key, frame: number): void {
    if (this.session.run(retimeKey(key.frame, frame)))
      this.session.seek(this.session.selection().keys[0] ?? frame);
  }

  protected rest(key: Key, rest: boolean): void {
    this.session.run(changeKey(key.frame, { rest }, rest ? 'Rest here' : 'Pass through'));
  }

  protected path(key: Key, path: Leg['path']): void {
    this.session.run(changeLeg(key.frame, { path }, `Travel ${path}`));
  }

  protected changeEase(key: Key, name: string): void {
    const known = EASES.find(each => each.ease === name);
    this.session.run(changeLeg(key.frame, { ease: known?.ease ?? { bezier: FIRST_CURVE } }, 'Change ease'));
  }

  protected handle(key: Key, index: number, value: number): void {
    const handles = this.handles();
    if (!handles) return;
    const [x1, y1, x2, y2] = handles.map((each, i) => (i === index ? value : each));
    this.session.run(changeLeg(key.frame, { ease: { bezier: [x1, y1, x2, y2] } }, 'Change curve'));
  }

  /** A smaller eye point draws less: the field of view goes along with it. */
  #change(key: Key, name: Numeric, value: number): Partial<Look> {
    if (name !== 'eye') return { [name]: value };
    const widest = maxFovRad(value) * DEG_PER_RAD;
    return { eye: value, fov: Math.min(key.fov, Math.floor(widest * 1e4) / 1e4) };
  }

  #numberOf(key: Key | undefined): number {
    return key ? this.session.move().keys.indexOf(key) + 1 : 0;
  }
}
