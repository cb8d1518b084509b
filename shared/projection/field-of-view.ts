import { FOV_MARGIN_DEG, FOV_MAX_DEG, FOV_MIN_DEG, RAD_PER_DEG } from '#shared/conventions';
import { angleAtRadius, radiusAtAngle } from './general-perspective';

export const FOV_MIN_RAD = FOV_MIN_DEG * RAD_PER_DEG;
const FOV_MAX_RAD = FOV_MAX_DEG * RAD_PER_DEG;
const FOV_MARGIN_RAD = FOV_MARGIN_DEG * RAD_PER_DEG;

/** The limit at eye point 0, the smallest of all: below it no eye point needs to be asked. */
export const FOV_ALWAYS_DRAWN_RAD = Math.PI - FOV_MARGIN_RAD;

/** @returns the widest horizontal field of view for an eye point in 0…1, radians: 170° at 0, 330° at 1 */
export function maxFovRad(eye: number): number {
  return Math.min(FOV_MAX_RAD, 2 * Math.acos(-eye) - FOV_MARGIN_RAD);
}

/** Keeps a horizontal field of view within 10° and the limit of its eye point. */
export function clampFovRad(fovRad: number, eye: number): number {
  if (fovRad < FOV_MIN_RAD) return FOV_MIN_RAD;
  return fovRad > FOV_ALWAYS_DRAWN_RAD ? Math.min(fovRad, maxFovRad(eye)) : fovRad;
}

/** ζ = ln tan(fov/4): going evenly in ζ is an even zoom. */
export function zoomFromFov(fovRad: number): number {
  return Math.log(Math.tan(fovRad / 4));
}

/** The inverse of {@link zoomFromFov}. */
export function fovFromZoom(zoom: number): number {
  return 4 * Math.atan(Math.exp(zoom));
}

/**
 * @param heightPerWidth the frame's height divided by its width
 * @returns the vertical field of view, radians
 */
export function verticalFovRad(fovRad: number, eye: number, heightPerWidth: number): number {
  return 2 * angleAtRadius(radiusAtAngle(fovRad / 2, eye) * heightPerWidth, eye);
}

/** @returns picture pixels per radian at the centre of a frame `widthPx` wide */
export function pixelsPerRadian(widthPx: number, fovRad: number, eye: number): number {
  return widthPx / (2 * radiusAtAngle(fovRad / 2, eye));
}
