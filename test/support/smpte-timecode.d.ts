declare module 'smpte-timecode' {
  /** A timecode of a frame number. */
  export default class Timecode {
    constructor(frame: number, frameRate: number, dropFrame: boolean);
    toString(): string;
  }
}
