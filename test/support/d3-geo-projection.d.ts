declare module 'd3-geo-projection' {
  /** General perspective from a distance in radii from the sphere's centre. */
  export function geoSatelliteRaw(distance: number): (lonRad: number, latRad: number) => [number, number];
}
