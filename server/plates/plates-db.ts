import { type Plate, type PlateVersionName } from '#schemas/api/plates';
import { type CrewScope } from '../crews/crew-scope';
import { versionUrl } from './plate-urls';

interface PlateRow {
  id: string;
  shot_id: string;
  frame: number;
  file_name: string;
  width: number;
  height: number;
  bytes: number;
  projection: 'stated' | 'assumed';
  created_at: Date;
}

interface VersionRow {
  plate_id: string;
  name: PlateVersionName;
  width: number;
  height: number;
  bytes: number;
  media_type: string;
  object_key: string;
}

/** A plate to be stored, its files in place. */
export interface PlateFacts {
  readonly id: string;
  readonly shotId: string;
  readonly frame: number;
  readonly fileName: string;
  readonly width: number;
  readonly height: number;
  readonly bytes: number;
  readonly projection: 'stated' | 'assumed';
  readonly versions: readonly {
    readonly name: PlateVersionName;
    readonly width: number;
    readonly height: number;
    readonly bytes: number;
    readonly mediaType: string;
    readonly objectKey: string;
  }[];
}

/** A shot's plates, by frame. */
export async function listPlates(scope: CrewScope, shotId: string): Promise<Plate[]> {
  const rows = await scope.rows<PlateRow>('plates').where({ shot_id: shotId }).orderBy(['frame', 'id']);
  return withVersions(scope, rows);
}

export async function findPlate(scope: CrewScope, id: string): Promise<Plate | undefined> {
  return (await withVersions(scope, await scope.rows<PlateRow>('plates').where({ id })))[0];
}

/** Where a version of a live plate is stored. */
export async function findVersion(
  scope: CrewScope,
  plateId: string,
  name: string,
): Promise<{ objectKey: string; mediaType: string } | undefined> {
  const row = await scope
    .rows<VersionRow>('plate_versions')
    .whereIn('plate_id', scope.rows('plates').where({ id: plateId }).select('id'))
    .where('name', name)
    .first<Pick<VersionRow, 'object_key' | 'media_type'> | undefined>('object_key', 'media_type');
  return row && { objectKey: row.object_key, mediaType: row.media_type };
}

/** @returns the last frame at which a plate of the shot stands; undefined where it has none */
export async function lastPlateFrame(scope: CrewScope, shotId: string): Promise<number | undefined> {
  const last = await scope
    .rows<PlateRow>('plates')
    .where({ shot_id: shotId })
    .orderBy('frame', 'desc')
    .first('frame');
  return last?.frame;
}

export async function insertPlate(scope: CrewScope, plate: PlateFacts): Promise<void> {
  const { id, shotId, frame, fileName, width, height, bytes, projection } = plate;
  await scope.insert('plates', {
    id,
    shot_id: shotId,
    frame,
    file_name: fileName,
    width,
    height,
    bytes,
    projection,
  });
  for (const version of plate.versions) {
    await scope.insert('plate_versions', {
      plate_id: id,
      name: version.name,
      width: version.width,
      height: version.height,
      bytes: version.bytes,
      media_type: version.mediaType,
      object_key: version.objectKey,
    });
  }
}

const LARGEST_FIRST: readonly PlateVersionName[] = ['display', '4096', '2048', 'thumb'];

async function withVersions(scope: CrewScope, rows: readonly PlateRow[]): Promise<Plate[]> {
  const versions = await scope.rows<VersionRow>('plate_versions').whereIn(
    'plate_id',
    rows.map(row => row.id),
  );
  const versionsOf = (plateId: string) =>
    LARGEST_FIRST.flatMap(name => versions.filter(v => v.plate_id === plateId && v.name === name));
  return rows.map(row => ({
    id: row.id,
    shotId: row.shot_id,
    frame: row.frame,
    fileName: row.file_name,
    width: row.width,
    height: row.height,
    bytes: row.bytes,
    projection: row.projection,
    versions: versionsOf(row.id).map(({ name, width, height, object_key }) => ({
      name,
      width,
      height,
      url: versionUrl(scope.member.crewId, row.id, name, object_key),
    })),
    createdAt: row.created_at.toISOString(),
  }));
}
