import { readFileSync } from 'node:fs';
import path from 'node:path';

/** @returns a file of test/fixtures */
export function fixture(name: string): Buffer {
  return readFileSync(path.join(process.cwd(), 'test/fixtures', name));
}

export function jsonFixture<T>(name: string): T {
  return JSON.parse(fixture(name).toString('utf8')) as T;
}

/** Rows of numbers as the reference files hold them. */
type Rows = number[][];

/** One case of scipy-reference.json; its maker, scipy-reference.py, says what each member is. */
export interface ScipyCase {
  readonly name: string;
  readonly times: number[];
  readonly keysYawPitchRollDeg: Rows;
  readonly keysQuat: Rows;
  readonly fovKeys: number[];
  readonly stepAnglesDeg: number[];
  readonly sampleTimes: number[];
  readonly slerp: { readonly q: Rows; readonly omega: Rows };
  readonly rotationSpline: { readonly q: Rows; readonly omega: Rows; readonly alpha: Rows };
  readonly fovCubicSpline: Readonly<
    Record<string, { readonly v: number[]; readonly d1: number[] } | undefined>
  >;
}

export const scipyCases = jsonFixture<{ cases: ScipyCase[] }>('scipy-reference.json').cases;
