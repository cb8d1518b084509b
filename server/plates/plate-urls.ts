import { type PlateVersionName } from '#schemas/api/plates';

/** Signs of the content's hash that a URL carries, so that a browser may keep the picture for ever. */
const HASH_SIGNS = 16;

/** @param objectKey key of the stored picture; it ends with its SHA-256 and a file extension */
export function versionUrl(
  crewId: string,
  plateId: string,
  name: PlateVersionName,
  objectKey: string,
): string {
  const hash = objectKey.replace(/^.*\//, '').slice(0, HASH_SIGNS);
  return `/api/crews/${crewId}/plates/${plateId}/versions/${name}?v=${hash}`;
}
