/** A thing of Vesper Haven at a known heading: north is yaw 0, the middle column; yaw grows to the right. */
export interface Landmark {
  readonly name: string;
  readonly yawDeg: number;
  readonly pitchDeg: number;
}

export const MOON: Landmark = { name: 'Moon', yawDeg: -38, pitchDeg: 27 };
export const LIGHTHOUSE: Landmark = { name: 'Lighthouse lamp', yawDeg: 24, pitchDeg: 6.4 };
export const CRANE: Landmark = { name: 'Crane', yawDeg: 76, pitchDeg: 8 };
export const BRIDGE: Landmark = { name: 'Bridge', yawDeg: -102, pitchDeg: 5 };
export const HARBOUR_OFFICE: Landmark = { name: 'Harbour office', yawDeg: 152, pitchDeg: 1.9 };

/** Boards on posts in the water, lit, each with the letter of its heading. */
export const BOARDS: readonly Landmark[] = [
  { name: 'N', yawDeg: 0, pitchDeg: 1.2 },
  { name: 'E', yawDeg: 90, pitchDeg: 1.2 },
  { name: 'S', yawDeg: 180, pitchDeg: 3.4 },
  { name: 'W', yawDeg: -90, pitchDeg: 1.2 },
];

export const LANDMARKS: readonly Landmark[] = [MOON, LIGHTHOUSE, CRANE, BRIDGE, HARBOUR_OFFICE, ...BOARDS];
