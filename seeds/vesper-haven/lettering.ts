import { type Light, type Painting, type Spot } from './painting';

/** Strokes of letters in a cell 4 wide and 6 high: a plain sign-writer's hand, drawn by us, so that no font is needed. */
const STROKES: Readonly<Record<string, readonly (readonly Spot[])[]>> = {
  A: [
    [
      [0, 0],
      [2, 6],
      [4, 0],
    ],
    [
      [0.8, 2.2],
      [3.2, 2.2],
    ],
  ],
  B: [
    [
      [0, 0],
      [0, 6],
      [2.6, 6],
      [3.6, 5.2],
      [3.6, 4],
      [2.6, 3.2],
      [0, 3.2],
    ],
    [
      [2.6, 3.2],
      [4, 2.3],
      [4, 0.9],
      [2.8, 0],
      [0, 0],
    ],
  ],
  C: [
    [
      [4, 4.8],
      [3, 6],
      [1, 6],
      [0, 4.8],
      [0, 1.2],
      [1, 0],
      [3, 0],
      [4, 1.2],
    ],
  ],
  E: [
    [
      [4, 6],
      [0, 6],
      [0, 0],
      [4, 0],
    ],
    [
      [0, 3.1],
      [3.2, 3.1],
    ],
  ],
  F: [
    [
      [4, 6],
      [0, 6],
      [0, 0],
    ],
    [
      [0, 3.1],
      [3.2, 3.1],
    ],
  ],
  H: [
    [
      [0, 0],
      [0, 6],
    ],
    [
      [4, 0],
      [4, 6],
    ],
    [
      [0, 3.1],
      [4, 3.1],
    ],
  ],
  I: [
    [
      [2, 0],
      [2, 6],
    ],
  ],
  N: [
    [
      [0, 0],
      [0, 6],
      [4, 0],
      [4, 6],
    ],
  ],
  O: [
    [
      [1, 0],
      [0, 1.2],
      [0, 4.8],
      [1, 6],
      [3, 6],
      [4, 4.8],
      [4, 1.2],
      [3, 0],
      [1, 0],
    ],
  ],
  R: [
    [
      [0, 0],
      [0, 6],
      [3, 6],
      [4, 5],
      [4, 4],
      [3, 3],
      [0, 3],
    ],
    [
      [2.2, 3],
      [4, 0],
    ],
  ],
  S: [
    [
      [4, 5],
      [3, 6],
      [1, 6],
      [0, 5],
      [0, 4],
      [1, 3.1],
      [3, 2.9],
      [4, 2],
      [4, 1],
      [3, 0],
      [1, 0],
      [0, 1],
    ],
  ],
  U: [
    [
      [0, 6],
      [0, 1.2],
      [1, 0],
      [3, 0],
      [4, 1.2],
      [4, 6],
    ],
  ],
  V: [
    [
      [0, 6],
      [2, 0],
      [4, 6],
    ],
  ],
  W: [
    [
      [0, 6],
      [1, 0],
      [2, 4],
      [3, 0],
      [4, 6],
    ],
  ],
  Y: [
    [
      [0, 6],
      [2, 3],
      [4, 6],
    ],
    [
      [2, 3],
      [2, 0],
    ],
  ],
};

const CELL = { width: 4, height: 6, gap: 1.9, space: 3 };

/** @returns the width of a line of text, degrees */
export function textWidth(text: string, height: number): number {
  const unit = height / CELL.height;
  const widths = [...text].map(sign => (sign === ' ' ? CELL.space : CELL.width));
  return unit * (widths.reduce((sum, width) => sum + width, 0) + CELL.gap * (text.length - 1));
}

/**
 * Writes a line of capitals.
 *
 * @param middle where the line's middle stands
 * @param height of a capital, degrees
 */
export function write(
  painting: Painting,
  text: string,
  [yaw, pitch]: Spot,
  height: number,
  light: Light,
  weight = 0.9,
): void {
  const unit = height / CELL.height;
  let left = yaw - textWidth(text, height) / 2;
  for (const sign of text) {
    for (const stroke of STROKES[sign] ?? []) {
      const spots = stroke.map(([x, y]): Spot => [left + x * unit, pitch - height / 2 + y * unit]);
      painting.strokes(spots, weight * unit, light);
      // Round joints: a stroke's ends are square.
      for (const spot of spots)
        painting.rectangle(
          spot[0] - (weight * unit) / 2,
          spot[1] - (weight * unit) / 2,
          weight * unit,
          weight * unit,
          light,
        );
    }
    left += ((sign === ' ' ? CELL.space : CELL.width) + CELL.gap) * unit;
  }
}
