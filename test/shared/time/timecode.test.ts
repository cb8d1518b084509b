import SmpteTimecode from 'smpte-timecode';

import { frameFromTimecode, framesPerDay, timecodeFromFrame } from '#shared/time/timecode';

const DF_2997 = { rate: { num: 30000, den: 1001 }, dropFrame: true };
const DF_5994 = { rate: { num: 60000, den: 1001 }, dropFrame: true };
const FPS_24 = { rate: { num: 24, den: 1 }, dropFrame: false };

// Truth: smpte-timecode 1.3.6, an npm library of its own making, over a whole day.
it('agrees with smpte-timecode over a whole day of 29.97 drop-frame', () => {
  const day = framesPerDay(DF_2997);
  let differences = 0;
  for (let frame = 0; frame < day; frame += 1) {
    const label = timecodeFromFrame(frame, DF_2997);
    if (frame % 41 === 0 && label !== new SmpteTimecode(frame, 29.97, true).toString()) differences++;
    if (frameFromTimecode(label, DF_2997) !== frame) differences++;
  }
  expect(differences).toBe(0);
});

it('agrees with smpte-timecode at 59.94 drop-frame', () => {
  for (let frame = 0; frame < framesPerDay(DF_5994); frame += 3001) {
    expect(timecodeFromFrame(frame, DF_5994)).toBe(new SmpteTimecode(frame, 59.94, true).toString());
  }
});

// SMPTE ST 12-1, as worked in MATHS §4 and §8.
it('drops the labels that SMPTE ST 12-1 drops', () => {
  expect(timecodeFromFrame(1799, DF_2997)).toBe('00:00:59;29');
  expect(timecodeFromFrame(1800, DF_2997)).toBe('00:01:00;02');
  expect(frameFromTimecode('01:00:00;00', DF_2997)).toBe(107_892);
  expect(frameFromTimecode('00:10:00;00', DF_2997)).toBe(17_982);
  expect(frameFromTimecode('00:01:00;00', DF_2997)).toBeUndefined();
});

it('wraps at 24 hours, either way', () => {
  expect(timecodeFromFrame(24 * 3600 * 24, FPS_24)).toBe('00:00:00:00');
  expect(timecodeFromFrame(-1, FPS_24)).toBe('23:59:59:23');
});

it.each([
  '',
  '1:2:3:4',
  '00:00:60:00',
  '00:60:00:00',
  '24:00:00:00',
  '00:00:00:24',
  '00:00:00;00',
  'aa:bb:cc:dd',
])('refuses %s at 24 frames a second', text => {
  expect(frameFromTimecode(text, FPS_24)).toBeUndefined();
});
