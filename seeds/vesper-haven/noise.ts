/**
 * Chance that comes out the same on every machine: the painting of a variant is one picture, not a new one each time.
 */

/** @returns a source of numbers in [0, 1); a 32-bit generator, plenty for scattering stars */
export function randomFrom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** @returns a number in [0, 1) that belongs to a lattice point */
function lattice(x: number, y: number, z: number): number {
  let h = Math.imul(x, 374761393) + Math.imul(y, 668265263) + Math.imul(z, 1440662683);
  h = Math.imul(h ^ (h >>> 13), 1274126177);
  return ((h ^ (h >>> 16)) >>> 0) / 4294967296;
}

function smooth(t: number): number {
  return t * t * (3 - 2 * t);
}

/** Value noise over a plane, 0…1, features one unit apart. */
export function noise2(x: number, y: number, seed = 0): number {
  const x0 = Math.floor(x);
  const y0 = Math.floor(y);
  const u = smooth(x - x0);
  const v = smooth(y - y0);
  const top = lattice(x0, y0, seed) * (1 - u) + lattice(x0 + 1, y0, seed) * u;
  const bottom = lattice(x0, y0 + 1, seed) * (1 - u) + lattice(x0 + 1, y0 + 1, seed) * u;
  return top * (1 - v) + bottom * v;
}

/** Value noise in space, 0…1: on directions it has no seam and no pole. */
export function noise3(x: number, y: number, z: number): number {
  const z0 = Math.floor(z);
  const w = smooth(z - z0);
  return noise2(x, y, z0) * (1 - w) + noise2(x, y, z0 + 1) * w;
}

/** Several octaves of noise in space, 0…1. */
export function cloud3(x: number, y: number, z: number, octaves: number): number {
  let sum = 0;
  let weight = 0.5;
  let total = 0;
  for (let i = 0, scale = 1; i < octaves; i++, scale *= 2.03, weight /= 2) {
    sum += weight * noise3(x * scale + 17 * i, y * scale, z * scale);
    total += weight;
  }
  return sum / total;
}
