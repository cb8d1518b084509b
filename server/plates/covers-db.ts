import { type PlatePicture } from '#schemas/api/plates';
import { type CrewScope } from '../crews/crew-scope';
import { versionUrl } from './plate-urls';

/** The first plate of each shot, as a picture, by the shot's id. */
export async function coversOfShots(
  scope: CrewScope,
  shotIds: readonly string[],
): Promise<Map<string, PlatePicture>> {
  const first = await scope
    .rows('plates')
    .distinctOn('plates.shot_id')
    .whereIn('plates.shot_id', [...shotIds])
    .orderBy(['plates.shot_id', 'plates.frame', 'plates.id'])
    .select<Cover[]>({ of: 'plates.shot_id', plateId: 'plates.id' });
  return picturesOf(scope, first);
}

/** The first plate of each shoot's oldest shot with one, as a picture, by the shoot's id. */
export async function coversOfShoots(
  scope: CrewScope,
  shootIds: readonly string[],
): Promise<Map<string, PlatePicture>> {
  const first = await scope
    .rows('plates')
    .join('shots', 'shots.id', 'plates.shot_id')
    .distinctOn('shots.shoot_id')
    .whereIn('shots.shoot_id', [...shootIds])
    .orderBy(['shots.shoot_id', 'shots.id', 'plates.frame', 'plates.id'])
    .select<Cover[]>({ of: 'shots.shoot_id', plateId: 'plates.id' });
  return picturesOf(scope, first);
}

interface Cover {
  of: string;
  plateId: string;
}

async function picturesOf(scope: CrewScope, covers: readonly Cover[]): Promise<Map<string, PlatePicture>> {
  const versions = await scope
    .rows<{ plate_id: string; name: 'thumb' | '2048'; object_key: string }>('plate_versions')
    .whereIn(
      'plate_id',
      covers.map(cover => cover.plateId),
    )
    .whereIn('name', ['thumb', '2048']);
  const urls = new Map(
    versions.map(v => [
      `${v.plate_id} ${v.name}`,
      versionUrl(scope.member.crewId, v.plate_id, v.name, v.object_key),
    ]),
  );
  return new Map(
    covers.map(({ of, plateId }) => [
      of,
      { plateId, thumbUrl: urls.get(`${plateId} thumb`) ?? '', url2048: urls.get(`${plateId} 2048`) ?? '' },
    ]),
  );
}
