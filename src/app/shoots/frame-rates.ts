import { type FrameRate } from '#shared/time/frame-rate';

/** A frame rate as people name it. */
export interface NamedRate {
  readonly name: string;
  readonly rate: FrameRate;
  readonly dropFrame: boolean;
}

/** The rates in common use (SMPTE ST 2048, ST 12-1 for the counting). */
export const NAMED_RATES: readonly NamedRate[] = [
  { name: '23.976 fps', rate: { num: 24000, den: 1001 }, dropFrame: false },
  { name: '24 fps', rate: { num: 24, den: 1 }, dropFrame: false },
  { name: '25 fps', rate: { num: 25, den: 1 }, dropFrame: false },
  { name: '29.97 fps, drop-frame', rate: { num: 30000, den: 1001 }, dropFrame: true },
  { name: '29.97 fps, non-drop', rate: { num: 30000, den: 1001 }, dropFrame: false },
  { name: '30 fps', rate: { num: 30, den: 1 }, dropFrame: false },
  { name: '50 fps', rate: { num: 50, den: 1 }, dropFrame: false },
  { name: '59.94 fps, drop-frame', rate: { num: 60000, den: 1001 }, dropFrame: true },
  { name: '59.94 fps, non-drop', rate: { num: 60000, den: 1001 }, dropFrame: false },
  { name: '60 fps', rate: { num: 60, den: 1 }, dropFrame: false },
];

export function nameOfRate(rate: FrameRate, dropFrame: boolean): string {
  const known = NAMED_RATES.find(
    each => each.rate.num === rate.num && each.rate.den === rate.den && each.dropFrame === dropFrame,
  );
  return known?.name ?? (rate.den === 1 ? `${rate.num} fps` : `${rate.num}/${rate.den} fps`);
}
