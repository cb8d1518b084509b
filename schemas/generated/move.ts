// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
/**
 * A name for people.
 */
export type Title = string;
/**
 * Free text.
 */
export type Notes = string;
/**
 * Pixels.
 */
export type Side = number;
/**
 * A whole source frame.
 */
export type Frame = number;
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
 * A camera move over spherical footage: where the flat frame looks at every moment. Angles in degrees, times in source frames unless said otherwise.
 */
export interface MoveDocument {
  format: 'fairlead.move';
  version: 1;
  title: Title;
  notes?: Notes;
  shot: Shot;
  /**
   * What the move is delivered as; the first is the one that the keys were made for.
   */
  deliverables: Deliverable[];
  /**
   * The keys, at rising whole source frames.
   */
  keys: Key[];
  extensions?: Extensions;
}
/**
 * What the move needs to know of the shot that it travels through.
 */
export interface Shot {
  title: Title;
  rate: Rate;
  /**
   * Source frames in the shot.
   */
  frames: number;
  /**
   * How many times faster the delivered film runs than the source.
   */
  speed: number;
  /**
   * First delivered source frame; the shot's first unless said.
   */
  from?: number;
  /**
   * Last delivered source frame, included; the shot's last unless said.
   */
  to?: number;
  /**
   * Timecode of source frame 0, SMPTE ST 12-1; 00:00:00:00 unless said.
   */
  start?: string;
  /**
   * Drop-frame counting, only at 30000/1001 and 60000/1001; false unless said.
   */
  dropFrame?: boolean;
  source: Source;
  /**
   * Unit quaternion x, y, z, w from source directions to the levelled world; none unless said.
   *
   * @minItems 4
   * @maxItems 4
   */
  level?: [number, number, number, number];
  /**
   * Heading of the stitch seam's great circle in source directions, degrees.
   */
  seamYaw?: number;
  /**
   * Whether the shot's end joins its beginning; false unless said.
   */
  loops?: boolean;
  /**
   * Seconds of one exposure.
   */
  exposure?: number;
  /**
   * Real seconds from one source frame to the next; one over the rate unless said.
   */
  interval?: number;
  extensions?: Extensions;
}
/**
 * Frames per second as a ratio: num / den, at most 1000.
 */
export interface Rate {
  /**
   * Frames.
   */
  num: number;
  /**
   * Seconds.
   */
  den: number;
}
/**
 * The equirectangular source picture.
 */
export interface Source {
  width: Side;
  height: Side;
}
/**
 * Members of other programs, kept as they are.
 */
export interface Extensions {
  [k: string]: unknown;
}
/**
 * A flat film that the move is delivered as.
 */
export interface Deliverable {
  /**
   * Unique in the document.
   */
  name: string;
  width: Side;
  height: Side;
  /**
   * Which of its sides keeps the first deliverable's coverage. Forbidden on the first, required on every other.
   */
  match?: 'width' | 'height' | 'diagonal';
  extensions?: Extensions;
}
/**
 * Where the frame looks at one source frame.
 */
export interface Key {
  frame: Frame;
  /**
   * Degrees to the right, not wrapped: 0 to 360 is one whole turn.
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
   * Horizontal field of view, degrees: 10 to min(330, 2·acos(−eye) − 10).
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
