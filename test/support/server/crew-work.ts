import { type MoveDocument } from '#schemas/move';
import { type Browser } from './test-app';
import { type TestCrew } from './test-crew';

/** The move document that the design of the format gives as its example (FORMATS, "The move document"). */
export const EXAMPLE: MoveDocument = {
  format: 'fairlead.move',
  version: 1,
  title: 'Quay, one turn with a dip',
  notes: '',
  shot: {
    title: 'Quay at blue hour',
    rate: { num: 24, den: 1 },
    frames: 1441,
    speed: 6,
    from: 0,
    to: 1440,
    start: '01:00:00:00',
    dropFrame: false,
    source: { width: 6144, height: 3072 },
    level: [0, 0, 0, 1],
    seamYaw: 90,
    loops: false,
    exposure: 0.02,
    interval: 0.0416666667,
  },
  deliverables: [
    { name: 'Wide', width: 1920, height: 1080 },
    { name: 'Tall', width: 1080, height: 1920, match: 'height' },
  ],
  keys: [
    {
      frame: 0,
      yaw: 0,
      pitch: 0,
      roll: 0,
      fov: 100,
      eye: 0.2,
      rest: false,
      leg: { path: 'level', ease: 'fair' },
    },
    { frame: 720, yaw: 180, pitch: -8, roll: 0, fov: 100, eye: 0.2, leg: { path: 'level', ease: 'fair' } },
    { frame: 1440, yaw: 360, pitch: 0, roll: 0, fov: 100, eye: 0.2 },
  ],
};

export const SHOT = {
  title: 'Quay',
  rate: { num: 24, den: 1 },
  frames: 1441,
  source: { width: 6144, height: 3072 },
};

export const base = (crew: TestCrew) => `/api/crews/${crew.id}`;

/** A shoot with a shot, made as a person would. */
export async function makeShot(
  browser: Browser,
  crew: TestCrew,
): Promise<{ shootId: string; shotId: string }> {
  const shoot = await browser
    .send('post', `${base(crew)}/shoots`)
    .send({ title: 'Harbour' })
    .expect(201);
  const shootId: string = shoot.body.id;
  const shot = await browser
    .send('post', `${base(crew)}/shoots/${shootId}/shots`)
    .send(SHOT)
    .expect(201);
  return { shootId, shotId: shot.body.id };
}

export async function makeMove(browser: Browser, crew: TestCrew, shotId: string): Promise<string> {
  const move = await browser
    .send('post', `${base(crew)}/shots/${shotId}/moves`)
    .send({ document: EXAMPLE })
    .expect(201);
  return move.body.id;
}
