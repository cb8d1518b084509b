import { type MoveDocument } from '#schemas/move';
import { GltfBuffer } from './gltf-buffer';
import { exactTurning } from './gltf-exact';
import { type Film, filmOf } from './gltf-film';
import { deliverableNamed } from '#shared/document/deliverable-named';

/** A camera that shows directions alone has nothing near it; glTF wants a plane in front of it all the same. */
const ZNEAR = 0.1;

/** Change of the field of view, radians, that is but the noise of splines through equal values. */
const STANDING_ZOOM_RAD = 1e-9;

const POINTER = 'KHR_animation_pointer';

const NOTE =
  'A glTF camera is rectilinear, so it is given the scale that the film has at the centre of its frame; ' +
  'the film itself has the horizontal field of view "fov" (degrees) and the eye point "eye" (0 rectilinear, ' +
  '1 stereographic), listed for each delivered frame. The camera stands in the levelled world, to which the ' +
  'quaternion "level" (x, y, z, w) turns the directions of the source.';

/**
 * The delivered move as a camera: glTF 2.0, one JSON text that holds its own buffer.
 *
 * A node with a perspective camera turns as the film does, times in delivered seconds. Where every leg is an arc with
 * linear ease and without whole turns, and field of view and eye point are constant, the poses of the keys say it
 * exactly; elsewhere there is a pose for each delivered frame, right at its own time (what LINEAR makes of the time
 * between two frames, where a hold cuts or the camera spins fast, is not the film's). A changing field of view goes
 * through KHR_animation_pointer; who does not know it keeps the first frame's. A film of one frame has no animation.
 *
 * @param document a valid one
 * @param deliverableName the first deliverable unless said
 * @throws UnknownDeliverable; FilmTooLong beyond MOST_GLTF_FRAMES (gltf-film.ts), where times would be too coarse
 * @see glTF 2.0 §3.10 (cameras), §3.11 (animations); KHR_animation_pointer
 */
export function cameraGltf(document: MoveDocument, deliverableName?: string): string {
  const { name, width, height } = deliverableNamed(document, deliverableName);
  const film = filmOf(document, deliverableName);
  const buffer = new GltfBuffer();
  const animated = film.seconds.length > 1;
  const file = {
    asset: { version: '2.0', generator: 'Fairlead', extras: filmExtras(document, film) },
    extensionsUsed: animated && zooms(film) ? [POINTER] : undefined,
    scene: 0,
    scenes: [{ nodes: [0] }],
    nodes: [{ name: document.title, camera: 0, rotation: Array.from(film.orientations.subarray(0, 4)) }],
    cameras: [
      {
        name,
        type: 'perspective',
        perspective: { aspectRatio: width / height, yfov: film.yfovsRad[0], znear: ZNEAR },
      },
    ],
    animations: animated ? [animationOf(document, film, buffer)] : undefined,
  };
  return `${JSON.stringify({ ...file, ...buffer.members() })}\n`;
}

function animationOf(document: MoveDocument, film: Film, buffer: GltfBuffer): object {
  const { seconds, orientations } = exactTurning(document) ?? film;
  const input = buffer.addTimes(seconds);
  const turn = { input, output: buffer.add(orientations, 'VEC4'), interpolation: 'LINEAR' };
  const turned = { sampler: 0, target: { node: 0, path: 'rotation' } };
  if (!zooms(film)) return { name: document.title, samplers: [turn], channels: [turned] };
  const zoom = { input, output: buffer.add(film.yfovsRad, 'SCALAR'), interpolation: 'LINEAR' };
  const pointer = { pointer: '/cameras/0/perspective/yfov' };
  const zoomed = { sampler: 1, target: { path: 'pointer', extensions: { [POINTER]: pointer } } };
  return { name: document.title, samplers: [turn, zoom], channels: [turned, zoomed] };
}

function zooms({ yfovsRad }: Film): boolean {
  return yfovsRad.some(yfov => Math.abs(yfov - yfovsRad[0]) > STANDING_ZOOM_RAD);
}

/** What the camera cannot say, for each delivered frame. */
function filmExtras({ shot }: MoveDocument, { fovsDeg, eyes }: Film): object {
  return {
    note: NOTE,
    rate: { num: shot.rate.num, den: shot.rate.den },
    level: shot.level ?? [0, 0, 0, 1],
    fov: Array.from(fovsDeg, shortened),
    eye: Array.from(eyes, shortened),
  };
}

/** To 12 decimals, as the frames table has them: what is beyond is rounding. */
function shortened(value: number): number {
  return Number(value.toFixed(12));
}
