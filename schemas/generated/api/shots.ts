// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
/**
 * Bodies of the shot routes, one member each. Members and ranges are those of a move document’s shot
 */
export interface ShotBodies {
  shot?: Shot;
  shotDraft?: ShotDraft;
  shotChanges?: ShotChanges;
  shotPage?: ShotPage;
}
/**
 * A shot of a shoot
 */
export interface Shot {
  /**
   * The shot: a UUID
   */
  id: string;
  /**
   * Its shoot: a UUID
   */
  shootId: string;
  /**
   * One line, not blank; 1 to 200 signs
   */
  title: string;
  /**
   * Frame rate as a fraction, frames a second; at most 1,000
   */
  rate: {
    /**
     * Numerator, frames
     */
    num: number;
    /**
     * Denominator, seconds
     */
    den: number;
  };
  /**
   * Length in source frames, 1 to 10,000,000
   */
  frames: number;
  /**
   * How many times faster it is delivered (6 = six times), 0.01 to 10,000
   */
  speed: number;
  /**
   * First delivered source frame
   */
  from: number;
  /**
   * Last delivered source frame, included
   */
  to: number;
  /**
   * SMPTE timecode of source frame 0, hh:mm:ss:ff, or hh:mm:ss;ff where frames are dropped
   */
  start: string;
  /**
   * Whether the timecode drops frame numbers; only at 30000/1001 and 60000/1001
   */
  dropFrame: boolean;
  /**
   * Size of the panorama
   */
  source: {
    /**
     * Width in pixels, 16 to 16,384
     */
    width: number;
    /**
     * Height in pixels, 16 to 16,384
     */
    height: number;
  };
  /**
   * Rotation from the source to the levelled world: unit quaternion x, y, z, w
   *
   * @minItems 4
   * @maxItems 4
   */
  level: [number, number, number, number];
  /**
   * Yaw of the stitch seam in degrees, in source directions; null where it is not known
   */
  seamYaw: number | null;
  /**
   * Whether the last frame leads into the first
   */
  loops: boolean;
  /**
   * Exposure time of a source frame in seconds; null where it is not known
   */
  exposure: number | null;
  /**
   * Real seconds from one source frame to the next; null for the frame rate’s own
   */
  interval: number | null;
  /**
   * Free text; up to 20,000 signs
   */
  notes: string;
  /**
   * Its plates: a count
   */
  plateCount: number;
  /**
   * Its moves: a count
   */
  moveCount: number;
  /**
   * A picture of it; null while there is no plate
   */
  cover: PlatePicture | null;
  /**
   * A count, one more after every change; it is also the ETag
   */
  revision: number;
  /**
   * When it was made: an instant, ISO 8601 in UTC
   */
  createdAt: string;
  /**
   * When it was last changed: an instant, ISO 8601 in UTC
   */
  updatedAt: string;
}
/**
 * A plate as a small picture
 */
export interface PlatePicture {
  /**
   * The plate: a UUID
   */
  plateId: string;
  /**
   * Up to 512 pixels wide
   */
  thumbUrl: string;
  /**
   * Up to 2048 pixels wide
   */
  url2048: string;
}
/**
 * A shot to be made; what is left out: the whole shot at its own speed, levelled, no seam
 */
export interface ShotDraft {
  /**
   * One line, not blank; 1 to 200 signs
   */
  title: string;
  /**
   * Frame rate as a fraction, frames a second; at most 1,000
   */
  rate: {
    /**
     * Numerator, frames
     */
    num: number;
    /**
     * Denominator, seconds
     */
    den: number;
  };
  /**
   * Length in source frames, 1 to 10,000,000
   */
  frames: number;
  /**
   * How many times faster it is delivered (6 = six times), 0.01 to 10,000
   */
  speed?: number;
  /**
   * First delivered source frame
   */
  from?: number;
  /**
   * Last delivered source frame, included
   */
  to?: number;
  /**
   * SMPTE timecode of source frame 0, hh:mm:ss:ff, or hh:mm:ss;ff where frames are dropped
   */
  start?: string;
  /**
   * Whether the timecode drops frame numbers; only at 30000/1001 and 60000/1001
   */
  dropFrame?: boolean;
  /**
   * Size of the panorama
   */
  source: {
    /**
     * Width in pixels, 16 to 16,384
     */
    width: number;
    /**
     * Height in pixels, 16 to 16,384
     */
    height: number;
  };
  /**
   * Rotation from the source to the levelled world: unit quaternion x, y, z, w
   *
   * @minItems 4
   * @maxItems 4
   */
  level?: [number, number, number, number];
  /**
   * Yaw of the stitch seam in degrees, in source directions; null where it is not known
   */
  seamYaw?: number | null;
  /**
   * Whether the last frame leads into the first
   */
  loops?: boolean;
  /**
   * Exposure time of a source frame in seconds; null where it is not known
   */
  exposure?: number | null;
  /**
   * Real seconds from one source frame to the next; null for the frame rate’s own
   */
  interval?: number | null;
  /**
   * Free text; up to 20,000 signs
   */
  notes?: string;
}
/**
 * What to change of a shot; what is left out stays
 */
export interface ShotChanges {
  /**
   * One line, not blank; 1 to 200 signs
   */
  title?: string;
  /**
   * Frame rate as a fraction, frames a second; at most 1,000
   */
  rate?: {
    /**
     * Numerator, frames
     */
    num: number;
    /**
     * Denominator, seconds
     */
    den: number;
  };
  /**
   * Length in source frames, 1 to 10,000,000
   */
  frames?: number;
  /**
   * How many times faster it is delivered (6 = six times), 0.01 to 10,000
   */
  speed?: number;
  /**
   * First delivered source frame
   */
  from?: number;
  /**
   * Last delivered source frame, included
   */
  to?: number;
  /**
   * SMPTE timecode of source frame 0, hh:mm:ss:ff, or hh:mm:ss;ff where frames are dropped
   */
  start?: string;
  /**
   * Whether the timecode drops frame numbers; only at 30000/1001 and 60000/1001
   */
  dropFrame?: boolean;
  /**
   * Size of the panorama
   */
  source?: {
    /**
     * Width in pixels, 16 to 16,384
     */
    width: number;
    /**
     * Height in pixels, 16 to 16,384
     */
    height: number;
  };
  /**
   * Rotation from the source to the levelled world: unit quaternion x, y, z, w
   *
   * @minItems 4
   * @maxItems 4
   */
  level?: [number, number, number, number];
  /**
   * Yaw of the stitch seam in degrees, in source directions; null where it is not known
   */
  seamYaw?: number | null;
  /**
   * Whether the last frame leads into the first
   */
  loops?: boolean;
  /**
   * Exposure time of a source frame in seconds; null where it is not known
   */
  exposure?: number | null;
  /**
   * Real seconds from one source frame to the next; null for the frame rate’s own
   */
  interval?: number | null;
  /**
   * Free text; up to 20,000 signs
   */
  notes?: string;
}
/**
 * A page of shots, newest first
 */
export interface ShotPage {
  items: Shot[];
  /**
   * Give it as `after` to get the next page; null on the last page
   */
  next: string | null;
}
