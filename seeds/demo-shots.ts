import { type ShootDraft } from '#schemas/api/shoots';
import { type ShotDraft } from '#schemas/api/shots';

export const DEMO_PLATE_WIDTH = 6144;
const SOURCE = { width: DEMO_PLATE_WIDTH, height: DEMO_PLATE_WIDTH / 2 };

/** The two paintings of the harbour. */
export type DemoVariant = 'blue-hour' | 'deep-night';

export interface DemoShot {
  readonly name: DemoShotName;
  readonly facts: ShotDraft;
  readonly plates: readonly { readonly frame: number; readonly variant: DemoVariant }[];
}

export type DemoShotName = 'quay' | 'ferry' | 'mole' | 'market' | 'stars';

export interface DemoShoot {
  readonly facts: ShootDraft;
  readonly shots: readonly DemoShot[];
}

const HALF_TILT_RAD = ((1.5 / 2) * Math.PI) / 180;

const harbour: DemoShoot = {
  facts: {
    title: 'Vesper Haven, harbour by night',
    place: 'Vesper Haven, end of the long quay',
    startsOn: '2026-10-09',
    notes:
      'Three passes between sunset and full dark. Tripod on the brass mark; seam turned to the harbour wall.',
  },
  shots: [
    {
      name: 'quay',
      facts: {
        title: 'Quay at blue hour',
        rate: { num: 24, den: 1 },
        frames: 1441,
        speed: 6,
        start: '01:00:00:00',
        source: SOURCE,
        seamYaw: 90,
        exposure: 0.02,
        interval: 0.0416666667,
        notes: 'Hyperlapse, 1/50 s. Sped up six times it has a shutter angle of 28.8°: keep the pan slow.',
      },
      plates: [{ frame: 0, variant: 'blue-hour' }],
    },
    {
      name: 'ferry',
      facts: {
        title: 'Last ferry in',
        rate: { num: 30000, den: 1001 },
        frames: 5395,
        speed: 8,
        start: '01:00:00;00',
        dropFrame: true,
        source: SOURCE,
        seamYaw: 90,
        exposure: 1 / 30,
        notes:
          'Three minutes, drop-frame, for the evening broadcast cut. The ferry’s horn is at 01:01:12;10.',
      },
      plates: [{ frame: 0, variant: 'blue-hour' }],
    },
    {
      name: 'mole',
      facts: {
        title: 'Walk along the mole',
        rate: { num: 60, den: 1 },
        frames: 5400,
        speed: 2,
        from: 240,
        to: 5279,
        start: '02:10:00:00',
        source: SOURCE,
        level: [Math.sin(HALF_TILT_RAD), 0, 0, Math.cos(HALF_TILT_RAD)],
        seamYaw: -90,
        exposure: 1 / 120,
        notes:
          'Pole over the shoulder, camera pitched 1.5°: levelled here. The first and last four seconds are setting up.',
      },
      plates: [{ frame: 240, variant: 'blue-hour' }],
    },
  ],
};

const exposures: DemoShoot = {
  facts: {
    title: 'Vesper Haven, the long exposure week',
    place: 'Vesper Haven, market square and lighthouse steps',
    startsOn: '2026-11-02',
    notes: 'Interval pictures and star sequences. Two batteries each; dew heater from 22:00.',
  },
  shots: [
    {
      name: 'market',
      facts: {
        title: 'Market lights, a picture every three seconds',
        rate: { num: 25, den: 1 },
        frames: 1200,
        speed: 1,
        start: '00:00:00:00',
        source: SOURCE,
        seamYaw: 180,
        exposure: 1.5,
        interval: 3,
        notes: 'One hour, dusk into night: 48 s delivered. Shutter angle 180°.',
      },
      plates: [
        { frame: 0, variant: 'blue-hour' },
        { frame: 1199, variant: 'deep-night' },
      ],
    },
    {
      name: 'stars',
      facts: {
        title: 'Stars over the lighthouse',
        rate: { num: 25, den: 1 },
        frames: 576,
        speed: 1,
        start: '00:00:00:00',
        source: SOURCE,
        seamYaw: 180,
        exposure: 20,
        interval: 25,
        notes: 'Four hours, 20 s every 25 s. The sky turns 60° meanwhile.',
      },
      plates: [{ frame: 0, variant: 'deep-night' }],
    },
  ],
};

export const DEMO_SHOOTS: readonly DemoShoot[] = [harbour, exposures];
