import { type Shot } from '#schemas/api/shots';
import { deliveredFrameCount } from '#shared/time/delivered-time';
import { framesPerSecond } from '#shared/time/frame-rate';
import { nameOfRate } from '../shoots/frame-rates';
import { textFromSeconds } from '../shoots/seconds-text';

/** One line of a shot's settings. */
export interface Fact {
  readonly name: string;
  readonly value: string;
}

/** @returns a shot's settings as a person reads them */
export function shotFacts(shot: Shot): Fact[] {
  const seconds = deliveredFrameCount(shot) / framesPerSecond(shot.rate);
  const whole = shot.from === 0 && shot.to === shot.frames - 1;
  const known = (value: number | null) => (value === null ? 'not known' : `${textFromSeconds(value)} s`);
  return [
    { name: 'Frame rate', value: nameOfRate(shot.rate, shot.dropFrame) },
    {
      name: 'Frames',
      value: whole ? count(shot.frames) : `${count(shot.frames)} (${count(shot.from)} to ${count(shot.to)})`,
    },
    { name: 'Speed-up', value: `${shot.speed}×` },
    { name: 'Delivered', value: `${seconds.toFixed(1)} s` },
    { name: 'Start', value: shot.start },
    { name: 'Exposure', value: known(shot.exposure) },
    { name: 'Interval', value: shot.interval === null ? 'one frame' : `${textFromSeconds(shot.interval)} s` },
    { name: 'Source', value: `${shot.source.width} × ${shot.source.height}` },
    { name: 'Stitch seam', value: shot.seamYaw === null ? 'not known' : `${shot.seamYaw}°` },
    { name: 'Loops', value: shot.loops ? 'yes' : 'no' },
  ];
}

function count(value: number): string {
  return value.toLocaleString('en');
}
