import { dimmed, type Light, type Painting, type Spot } from './painting';
import { paintReflection } from './water';

/** A lamp: where, its colour, and how strong; 1 is a street lamp at the near shore. */
export interface Lamp {
  readonly at: Spot;
  readonly colour: Light;
  readonly strength: number;
  /** Whether the water before it shows it. */
  readonly mirrored: boolean;
}

/** The lamp itself: a white core, its colour around it, and a wide faint bloom. */
export function paintLamp(painting: Painting, { at, colour, strength }: Lamp): void {
  painting.glow(at, 0.05, dimmed([1, 0.95, 0.88], 2.2 * strength));
  painting.glow(at, 0.16, dimmed(colour, 0.85 * strength));
  painting.glow(at, 0.65, dimmed(colour, 0.085 * strength));
  if (strength > 0.7) painting.glow(at, 2.2, dimmed(colour, 0.014 * strength));
}

export function paintLampReflection(
  painting: Painting,
  { at, colour, strength, mirrored }: Lamp,
  seed: number,
): void {
  if (mirrored) paintReflection(painting, at, colour, strength, seed);
}
