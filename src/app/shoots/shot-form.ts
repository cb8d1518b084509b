import {
  type AbstractControl,
  FormControl,
  FormGroup,
  type ValidationErrors,
  type ValidatorFn,
  Validators,
} from '@angular/forms';

import { type Shot, type ShotDraft } from '#schemas/api/shots';
import { frameFromTimecode } from '#shared/time/timecode';
import { NAMED_RATES, nameOfRate } from './frame-rates';
import { secondsFromText, textFromSeconds } from './seconds-text';

/** What the form starts from where there is no shot yet. */
const FRESH = {
  title: '',
  rate: { num: 24, den: 1 },
  dropFrame: false,
  frames: 1440,
  speed: 1,
  from: 0,
  to: 1439,
  start: '00:00:00:00',
  source: { width: 6144, height: 3072 },
  exposure: null,
  interval: null,
  seamYaw: null,
  loops: false,
  notes: '',
} as const;

const whole = (least: number, most: number) => [
  Validators.required,
  Validators.pattern(/^\d+$/),
  Validators.min(least),
  Validators.max(most),
];

function seconds(control: AbstractControl<string>): ValidationErrors | null {
  return secondsFromText(control.value) === undefined ? { seconds: true } : null;
}

/** The form's values, as text and numbers that a person edits. */
export type ShotForm = ReturnType<typeof shotForm>;

export function shotForm(shot: Shot | undefined) {
  const { rate, dropFrame, source, exposure, interval, ...rest } = shot ?? FRESH;
  const control = <T>(value: T, validators: ValidatorFn[] = []) =>
    new FormControl(value, { nonNullable: true, validators });
  return new FormGroup(
    {
      title: control(rest.title, [Validators.required, Validators.pattern(/\S/)]),
      rate: control(nameOfRate(rate, dropFrame), [Validators.required]),
      frames: control<number>(rest.frames, whole(1, 10_000_000)),
      speed: control<number>(rest.speed, [Validators.required, Validators.min(0.01), Validators.max(10_000)]),
      from: control<number>(rest.from, whole(0, 9_999_999)),
      to: control<number>(rest.to, whole(0, 9_999_999)),
      start: control<string>(rest.start, [Validators.required]),
      width: control<number>(source.width, whole(16, 16_384)),
      exposure: control(textFromSeconds(exposure), [seconds]),
      interval: control(textFromSeconds(interval), [seconds]),
      seamYaw: control<number | null>(rest.seamYaw, [Validators.min(-36_000), Validators.max(36_000)]),
      loops: control<boolean>(rest.loops),
      notes: control<string>(rest.notes),
    },
    { validators: [insideTheShot, timecodeFits] },
  );
}

function insideTheShot(
  group: AbstractControl<{ frames: number; from: number; to: number }>,
): ValidationErrors | null {
  const { frames, from, to } = group.value;
  if (from > to) return { range: 'The last delivered frame must not be before the first.' };
  return to >= frames
    ? { range: `The shot's last frame is ${frames - 1}: its frames are counted from 0.` }
    : null;
}

function timecodeFits(group: AbstractControl<{ rate: string; start: string }>): ValidationErrors | null {
  const { start } = group.value;
  const { rate, dropFrame } = rateNamed(group.value.rate);
  const text = dropFrame ? start.replace(/:(\d+)$/, ';$1') : start;
  return frameFromTimecode(text, { rate, dropFrame }) === undefined
    ? { start: `A timecode of this rate, such as ${dropFrame ? '01:00:00;00' : '01:00:00:00'}.` }
    : null;
}

export function rateNamed(name: string) {
  const custom = /^(\d+)(?:\/(\d+))? fps$/.exec(name);
  return (
    NAMED_RATES.find(each => each.name === name) ?? {
      name,
      rate: { num: Number(custom?.[1] ?? 24), den: Number(custom?.[2] ?? 1) },
      dropFrame: false,
    }
  );
}

/** @returns the shot that a valid form describes; the source is 2:1 */
export function draftOf(form: ShotForm): ShotDraft {
  const { rate: name, width, exposure, interval, ...rest } = form.getRawValue();
  const { rate, dropFrame } = rateNamed(name);
  return {
    ...rest,
    rate: { ...rate },
    dropFrame,
    source: { width, height: Math.round(width / 2) },
    exposure: secondsFromText(exposure) ?? null,
    interval: secondsFromText(interval) ?? null,
  };
}
