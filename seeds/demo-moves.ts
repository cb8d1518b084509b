import { type Deliverable, type Key, type MoveDocument } from '#schemas/move';
import { type DemoShotName } from './demo-shots';

/** A move of the demo, without the shot's facts, which come from the shot. */
export interface DemoMove extends Pick<MoveDocument, 'title' | 'notes' | 'deliverables' | 'keys'> {
  readonly shot: DemoShotName;
}

type Path = NonNullable<Key['leg']>['path'];
type Ease = NonNullable<Key['leg']>['ease'];

/** Frame, yaw, pitch, roll, fov, eye point; then the way to the next key. */
type KeyRow = readonly [number, number, number, number, number, number, (readonly [Path, Ease])?, 'rest'?];

function keysOf(rows: readonly KeyRow[]): MoveDocument['keys'] {
  return rows.map(([frame, yaw, pitch, roll, fov, eye, leg, rest]) => ({
    ...{ frame, yaw, pitch, roll, fov, eye },
    ...(rest ? { rest: true } : {}),
    ...(leg ? { leg: { path: leg[0], ease: leg[1] } } : {}),
  }));
}

const WIDE: Deliverable = { name: 'Wide', width: 1920, height: 1080 };
const TALL: Deliverable = { name: 'Tall', width: 1080, height: 1920, match: 'height' };
const SQUARE: Deliverable = { name: 'Square', width: 1080, height: 1080, match: 'diagonal' };

export const DEMO_MOVES: readonly DemoMove[] = [
  {
    shot: 'quay',
    title: 'Quay, one turn with a dip',
    notes: 'One turn at an even pace, with a look down at the water half-way.',
    deliverables: [WIDE, TALL],
    keys: keysOf([
      [0, 0, 0, 0, 100, 0.2, ['level', 'fair']],
      [720, 180, -8, 0, 100, 0.2, ['level', 'fair']],
      [1440, 360, 0, 0, 100, 0.2],
    ]),
  },
  {
    shot: 'quay',
    title: 'Harbour lights into a little planet',
    notes:
      'Opens from the lamps to the whole town as a planet; the eye point goes back with the field of view.',
    deliverables: [WIDE, SQUARE],
    keys: keysOf([
      [0, 20, -2, 0, 60, 0, ['level', 'fair'], 'rest'],
      [480, 55, -12, 0, 115, 0.35, ['level', 'fair']],
      [960, 95, -48, 0, 210, 0.85, ['level', 'fair']],
      [1440, 130, -90, 0, 300, 1, undefined, 'rest'],
    ]),
  },
  {
    shot: 'ferry',
    title: 'Follow the ferry, upright',
    notes: 'The horizon stays level; the ferry keeps to the lower third of the upright cut.',
    deliverables: [WIDE, TALL, SQUARE],
    keys: keysOf([
      [0, -72, 1, 0, 78, 0, ['level', 'fair'], 'rest'],
      [1500, -41, -1, 0, 72, 0, ['level', 'fair']],
      [3100, 4, -3, 0, 66, 0, ['level', 'fair']],
      [4400, 38, -4, 0, 70, 0, ['level', 'fair']],
      [5394, 52, -3, 0, 76, 0, undefined, 'rest'],
    ]),
  },
  {
    shot: 'ferry',
    title: 'Whip from lamp to lamp, and settle',
    notes: 'Eased by curves: a long look, a whip over the water, a settle, a slow drift out.',
    deliverables: [WIDE],
    keys: keysOf([
      [0, -36, 3, 0, 72, 0, ['level', 'ease-in-out']],
      [1600, -30, 3, 0, 68, 0, ['arc', { bezier: [0.72, 0, 0.12, 1] }]],
      [1960, 92, 7, 0, 74, 0, ['level', 'ease-out']],
      [2700, 96, 6, 0, 70, 0, ['level', 'linear']],
      [5394, 108, 6, 0, 70, 0],
    ]),
  },
  {
    shot: 'mole',
    title: 'Drift along the mole',
    notes: 'Leans a little into the bend, as a person walking does.',
    deliverables: [WIDE, TALL],
    keys: keysOf([
      [240, -12, 0, 0, 95, 0.1, ['level', 'ease']],
      [1900, 14, -2, 3, 95, 0.1, ['level', 'ease-in-out']],
      [3600, -8, -1, -2, 90, 0.1, ['level', 'ease']],
      [5279, 0, 0, 0, 95, 0.1],
    ]),
  },
  {
    shot: 'market',
    title: 'Market corners, cut on the bell',
    notes: 'Four still looks, cut; the last one breathes out.',
    deliverables: [WIDE, SQUARE],
    keys: keysOf([
      [0, 0, -4, 0, 84, 0, ['level', 'hold']],
      [300, 92, -6, 0, 70, 0, ['level', 'hold']],
      [600, 184, -3, 0, 84, 0, ['level', 'hold']],
      [900, 275, -5, 0, 62, 0, ['level', 'ease']],
      [1199, 290, 4, 0, 100, 0.15],
    ]),
  },
  {
    shot: 'stars',
    title: 'Swing through the star field',
    notes: 'Great-circle swings past the zenith; nobody needs a level horizon up there.',
    deliverables: [WIDE],
    keys: keysOf([
      [0, -30, 25, 0, 110, 0.4, ['arc', 'ease-in']],
      [190, 40, 68, 12, 120, 0.5, ['arc', 'linear']],
      [385, 150, 62, 28, 120, 0.5, ['arc', 'ease-out']],
      [575, 205, 22, 0, 105, 0.4],
    ]),
  },
  {
    shot: 'stars',
    title: 'Rise from under the lighthouse',
    notes: 'Begins straight down as a planet, unrolls half a turn and rises to the lamp.',
    deliverables: [WIDE, TALL],
    keys: keysOf([
      [0, 0, -90, 180, 280, 1, ['level', 'fair'], 'rest'],
      [240, 24, -52, 70, 180, 0.7, ['level', 'fair']],
      [430, 40, -4, 8, 104, 0.25, ['level', 'fair']],
      [575, 46, 12, 0, 82, 0, undefined, 'rest'],
    ]),
  },
];
