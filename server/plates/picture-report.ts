import { type PlateVersionName } from '#schemas/api/plates';

/** What is asked of the worker: look at a file, and make the versions in a folder. */
export interface PictureTask {
  readonly file: string;
  readonly folder: string;
}

/** A version that was made. */
export interface MadeVersion {
  readonly name: PlateVersionName;
  readonly file: string;
  readonly width: number;
  readonly height: number;
  readonly bytes: number;
  readonly mediaType: 'image/jpeg' | 'image/webp';
  /** Hexadecimal. */
  readonly sha256: string;
}

export interface PictureMade {
  readonly width: number;
  readonly height: number;
  readonly projection: 'stated' | 'assumed';
  readonly versions: readonly MadeVersion[];
}

/** Why a picture is refused: the kinds are the last parts of problem types. */
export interface PictureRefused {
  readonly kind:
    | 'not-a-picture'
    | 'broken-picture'
    | 'picture-size'
    | 'not-2-to-1'
    | 'partial-panorama'
    | 'moving-picture';
  readonly detail: string;
}

/** What the worker answers; `failed` is a fault of ours or of the machine. */
export type PictureReport =
  | { readonly made: PictureMade }
  | { readonly refused: PictureRefused }
  | { readonly failed: string; readonly code?: string };
