import { type Light } from './painting';

export type Variant = 'blue-hour' | 'deep-night';

/** What time of night it is. */
export interface Palette {
  readonly zenith: Light;
  readonly middle: Light;
  readonly horizon: Light;
  /** After the sun, over the west. */
  readonly afterglow: Light;
  /** Over the town. */
  readonly townGlow: Light;
  readonly deepWater: Light;
  readonly hill: Light;
  readonly stone: Light;
  /** Times the number and light of stars. */
  readonly stars: number;
  readonly milkyWay: number;
  readonly moon: number;
  readonly exposure: number;
}

export const PALETTES: Readonly<Record<Variant, Palette>> = {
  'blue-hour': {
    zenith: [0.008, 0.02, 0.075],
    middle: [0.022, 0.05, 0.14],
    horizon: [0.085, 0.105, 0.17],
    afterglow: [0.62, 0.25, 0.1],
    townGlow: [0.16, 0.085, 0.035],
    deepWater: [0.002, 0.007, 0.016],
    hill: [0.007, 0.011, 0.026],
    stone: [0.03, 0.033, 0.042],
    stars: 0.55,
    milkyWay: 0.25,
    moon: 0.85,
    exposure: 1.9,
  },
  'deep-night': {
    zenith: [0.0016, 0.003, 0.0085],
    middle: [0.003, 0.0055, 0.014],
    horizon: [0.012, 0.016, 0.026],
    afterglow: [0.016, 0.013, 0.016],
    townGlow: [0.085, 0.05, 0.022],
    deepWater: [0.0005, 0.0014, 0.0032],
    hill: [0.0015, 0.0022, 0.0048],
    stone: [0.009, 0.01, 0.0125],
    stars: 1.6,
    milkyWay: 1,
    moon: 1,
    exposure: 2.7,
  },
};

export const LAMP_WARM: Light = [1, 0.56, 0.2];
export const LAMP_WHITE: Light = [1, 0.86, 0.66];
export const LAMP_COLD: Light = [0.55, 0.78, 1];
export const LAMP_RED: Light = [1, 0.1, 0.06];
export const LAMP_GREEN: Light = [0.1, 0.9, 0.45];
