// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
/**
 * How time runs along a leg: smooth through the keys, evenly, standing, or by a CSS easing curve.
 */
export type Ease =
  | ('fair' | 'linear' | 'hold' | 'ease' | 'ease-in' | 'ease-out' | 'ease-in-out')
  | {
      /**
       * x1, y1, x2, y2 of CSS cubic-bezier(): x within 0…1, y within ±10.
       *
       * @minItems 4
       * @maxItems 4
       */
      bezier: [number, number, number, number];
    };

/**
 * A camera move to be used again on other shots: keys along the move instead of at frames, yaw from where it starts to look. Angles in degrees.
 */
export interface SavedMove {
  format: 'fairlead.saved-move';
  version: 1;
  /**
   * A name for people.
   */
  title: string;
  /**
   * Free text.
   */
  notes?: string;
  /**
   * What it was made for; the field of view is meant for the first.
   */
  deliverables: Deliverable[];
  /**
   * The keys, at rising places along the move: the first at 0, the last of several at 1.
   */
  keys: SavedKey[];
  /**
   * Words to find it by.
   */
  tags?: string[];
  /**
   * Who made it.
   */
  author?: string;
  /**
   * Under which licence it may be used: an SPDX licence name or expression, such as CC-BY-4.0.
   */
  licence?: string;
  /**
   * Usual length, seconds of the delivered film.
   */
  usual?: number;
  /**
   * Turns of yaw from the first key to the last, to the right; not always whole.
   */
  turns?: number;
  extensions?: Extensions;
}
/**
 * A flat film that the move is delivered as.
 */
export interface Deliverable {
  /**
   * Unique in the document.
   */
  name: string;
  /**
   * Pixels.
   */
  width: number;
  /**
   * Pixels.
   */
  height: number;
  /**
   * Which of its sides keeps the first deliverable's coverage. Forbidden on the first, required on every other.
   */
  match?: 'width' | 'height' | 'diagonal';
  extensions?: Extensions;
}
/**
 * Members of other programs, kept as they are.
 */
export interface Extensions {
  [k: string]: unknown;
}
/**
 * Where the frame looks at one place along the move.
 */
export interface SavedKey {
  /**
   * Share of the move's length, 0 to 1.
   */
  at: number;
  /**
   * Degrees to the right of the first key's yaw, not wrapped; 0 at the first.
   */
  yaw: number;
  /**
   * Degrees up.
   */
  pitch: number;
  /**
   * Degrees clockwise as the operator sees it, not wrapped.
   */
  roll: number;
  /**
   * Horizontal field of view of the first deliverable, degrees: 10 to min(330, 2·acos(−eye) − 10).
   */
  fov: number;
  /**
   * Eye point: 0 rectilinear, 1 stereographic.
   */
  eye: number;
  /**
   * Whether the camera stands still here; false unless said.
   */
  rest?: boolean;
  leg?: Leg;
  extensions?: Extensions;
}
/**
 * How the camera travels from this key to the next. Required on all keys but the last, forbidden there.
 */
export interface Leg {
  /**
   * By the shortest rotation, or with yaw, pitch and roll each going straight.
   */
  path: 'arc' | 'level';
  ease: Ease;
  extensions?: Extensions;
}
