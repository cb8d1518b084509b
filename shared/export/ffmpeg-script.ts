import { type MoveDocument } from '#schemas/move';
import { type CompleteShotTimes, shotTimes } from '#shared/document/shot-times';
import { fraction } from './fraction';
import { type V360Film, v360Film, type V360View } from './v360-commands';

/** Frames whose commands share a file: FFmpeg reads a file of commands in quadratic time. */
const FRAMES_A_FILE = 5000;

/** What changes from frame to frame. */
const COMMANDS = ['yaw', 'pitch', 'roll', 'd_fov'] as const satisfies readonly (keyof V360View)[];

/** Largest numerator and denominator of a time base in FFmpeg. */
const MOST_TICKS = 2 ** 31 - 1;

/**
 * A script that renders the delivered film from the shot's own footage with FFmpeg, and the commands that it needs:
 * `bash render.sh FOOTAGE OUT`.
 *
 * Delivered frame j shows footage frame floor(from + j · speed): a picture cannot be shown in part. Footage frames are
 * counted, whatever times they carry; the time base is chosen so that every one of them is a whole number of ticks, since
 * a rounded one would now and then come a frame late. A speed of many decimals (7.123456 at 60000/1001) is taken as the
 * nearest fraction that fits FFmpeg's time base, and a frame in a hundred may then be its neighbour. Each frame's commands hold from half a frame early to half a frame
 * late. Sides that are odd are made even. Sound is left out: at another speed it would no longer fit. Footage that ends
 * before the film does makes no film, rather than a short one.
 *
 * @param framesAFile how many frames' commands go into one file
 * @returns texts by file name: `render.sh` and `move.cmd`, or `move-1.cmd`, `move-2.cmd`, … of long films
 * @throws EyePointBetween, NotForFfmpeg, UnknownDeliverable
 */
export function ffmpegScript(
  document: MoveDocument,
  deliverableName?: string,
  framesAFile = FRAMES_A_FILE,
): Record<string, string> {
  const film = v360Film(document, deliverableName);
  const times = shotTimes(document.shot);
  const parts = Math.ceil(film.views.length / framesAFile);
  const commands = Array.from({ length: parts }, (_, part) => {
    const name = parts === 1 ? 'move.cmd' : `move-${part + 1}.cmd`;
    return [name, commandsOf(film, times, part * framesAFile, framesAFile)] as const;
  });
  const graph = filterGraph(
    document,
    film,
    times,
    commands.map(([name]) => name),
  );
  return { 'render.sh': script(document, film.views.length, graph), ...Object.fromEntries(commands) };
}

/** One closed interval for each frame in which something changes. */
function commandsOf({ views }: V360Film, { rate }: CompleteShotTimes, first: number, count: number): string {
  const seconds = (frame: number) => ((Math.max(frame, 0) * rate.den) / rate.num).toFixed(6);
  const lines = views.slice(first, first + count).flatMap((view, i) => {
    const frame = first + i;
    const before = frame === 0 ? view : views[frame - 1];
    const changes = COMMANDS.filter(name => view[name] !== before[name]);
    if (changes.length === 0) return [];
    const told = changes.map(name => `v360 ${name} ${view[name]}`).join(', ');
    return [`${seconds(frame - 0.5)}-${seconds(frame + 0.5)} ${told};`];
  });
  return `# Camera angles and field of view, frame by frame, for FFmpeg's sendcmd; render.sh reads them.\n${lines.join('\n')}\n`;
}

function filterGraph(
  { shot }: MoveDocument,
  { width, height, projection, views: [first] }: V360Film,
  { rate, speed, from }: CompleteShotTimes,
  files: readonly string[],
): string {
  const { width: across, height: down } = shot.source;
  const faster = fraction(speed, Math.max(Math.floor(MOST_TICKS / rate.num), Math.ceil(speed)));
  return [
    `trim=start_frame=${from}`,
    `settb=${rate.den}/${rate.num * faster.num}`,
    `setpts=N*${faster.den}`,
    `fps=${rate.num}/${rate.den}:round=up`,
    ...files.map(file => `sendcmd=f=${file}`),
    [
      `v360=e:${projection}:w=${width}:h=${height}:reset_rot=1`,
      // v360 takes the outer pixels' centres for the edges of the sphere.
      `ih_fov=${(360 * (across - 1)) / across}:iv_fov=${(180 * (down - 1)) / down}`,
      `h_fov=${first.h_fov}:v_fov=${first.v_fov}:yaw=${first.yaw}:pitch=${first.pitch}:roll=${first.roll}`,
    ].join(':'),
  ].join(',');
}

function script({ title }: MoveDocument, frames: number, graph: string): string {
  return `#!/usr/bin/env bash
# ${title.replace(/[\p{Cc}\u2028\u2029]+/gu, ' ')}
#
# Renders this camera move from its footage with FFmpeg:
#
#     bash render.sh FOOTAGE OUT.mp4
#
# The film has ${frames} frames and no sound. For another encoder set ENCODER, for instance
# ENCODER='-c:v prores_ks -profile:v 3' with a name that ends in .mov.
set -euo pipefail

fail() {
  echo "render.sh: $*" >&2
  exit 2
}

[ $# -eq 2 ] || fail 'name the footage and the film: bash render.sh FOOTAGE OUT.mp4'
command -v ffmpeg > /dev/null || fail 'FFmpeg is not installed'
[ -f "$1" ] || fail "there is no footage $1"
[ ! -e "$2" ] || fail "$2 is there already; nothing was changed. Take it away or choose another name"

absolute() {
  case $1 in
    /*) printf '%s' "$1" ;;
    *) printf '%s' "$PWD/$1" ;;
  esac
}
footage=$(absolute "$1")
out=$(absolute "$2")
# Half-made films have another name, so that what stands under its name is whole.
part="$(dirname "$out")/.part-$$-$(basename "$out")"
trap 'rm -f "$part"' EXIT
read -r -a encoder <<< "\${ENCODER:--c:v libx264 -preset medium -crf 16 -pix_fmt yuv420p}"

CDPATH='' cd -- "$(dirname -- "\${BASH_SOURCE[0]}")"
made=$(ffmpeg -hide_banner -loglevel warning -stats -nostdin -i "file:$footage" -map 0:v:0 -an \\
  -vf '${graph}' \\
  -frames:v ${frames} -progress pipe:1 "\${encoder[@]}" "file:$part" | sed -n 's/^frame=//p' | tail -n 1)
[ "$made" = ${frames} ] || fail "the footage ends too soon: it gives \${made:-0} of ${frames} frames. Nothing was kept"
mv "$part" "$out"
`;
}
