import { type Knex } from 'knex';

/** What was shot and how it is looked at. A row can only refer to rows of its own crew: every reference names it too. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table shoots (
      id uuid constraint shoots_pkey primary key,
      crew_id uuid not null constraint shoots_crew_fkey references crews (id) on delete cascade,
      title text not null constraint shoots_title_length check (char_length(title) between 1 and 200),
      place text not null default '' constraint shoots_place_length check (char_length(place) <= 200),
      notes text not null default '' constraint shoots_notes_length check (char_length(notes) <= 20000),
      starts_on date,
      revision integer not null default 1 constraint shoots_revision_positive check (revision > 0),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      deleted_at timestamptz,
      constraint shoots_crew_id_unique unique (crew_id, id)
    );

    create table shots (
      id uuid constraint shots_pkey primary key,
      crew_id uuid not null constraint shots_crew_fkey references crews (id) on delete cascade,
      shoot_id uuid not null,
      title text not null constraint shots_title_length check (char_length(title) between 1 and 200),
      rate_num integer not null,
      rate_den integer not null,
      frames integer not null constraint shots_frames_range check (frames between 1 and 10000000),
      speed double precision not null constraint shots_speed_range check (speed between 0.01 and 10000),
      from_frame integer not null,
      to_frame integer not null,
      start_timecode text not null,
      drop_frame boolean not null,
      source_width integer not null constraint shots_source_width_range check (source_width between 16 and 16384),
      source_height integer not null constraint shots_source_height_range check (source_height between 16 and 16384),
      level double precision[] not null constraint shots_level_four check (cardinality(level) = 4),
      seam_yaw double precision constraint shots_seam_yaw_range check (seam_yaw between -36000 and 36000),
      loops boolean not null,
      exposure_sec double precision constraint shots_exposure_range check (exposure_sec > 0 and exposure_sec <= 86400),
      interval_sec double precision constraint shots_interval_range check (interval_sec > 0 and interval_sec <= 86400),
      notes text not null constraint shots_notes_length check (char_length(notes) <= 20000),
      revision integer not null default 1 constraint shots_revision_positive check (revision > 0),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      deleted_at timestamptz,
      constraint shots_crew_id_unique unique (crew_id, id),
      constraint shots_shoot_fkey foreign key (crew_id, shoot_id) references shoots (crew_id, id) on delete cascade,
      constraint shots_rate_range check (
        rate_num between 1 and 1000000 and rate_den between 1 and 1000000 and rate_num <= 1000 * rate_den::bigint
      ),
      constraint shots_range_inside check (from_frame between 0 and to_frame and to_frame < frames)
    );
    create index shots_shoot_index on shots (crew_id, shoot_id, id);

    create table plates (
      id uuid constraint plates_pkey primary key,
      crew_id uuid not null constraint plates_crew_fkey references crews (id) on delete cascade,
      shot_id uuid not null,
      frame integer not null constraint plates_frame_positive check (frame >= 0),
      file_name text not null constraint plates_file_name_length check (char_length(file_name) between 1 and 200),
      width integer not null constraint plates_width_range check (width between 512 and 12000),
      height integer not null constraint plates_height_range check (height between 256 and 6001),
      bytes integer not null constraint plates_bytes_positive check (bytes > 0),
      projection text not null constraint plates_projection_known check (projection in ('stated', 'assumed')),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      deleted_at timestamptz,
      constraint plates_crew_id_unique unique (crew_id, id),
      constraint plates_shot_fkey foreign key (crew_id, shot_id) references shots (crew_id, id) on delete cascade,
      constraint plates_two_to_one check (abs(width - 2 * height) <= 2)
    );
    create index plates_shot_index on plates (crew_id, shot_id, frame, id);

    create table plate_versions (
      crew_id uuid not null,
      plate_id uuid not null,
      name text not null constraint plate_versions_name_known check (name in ('display', '4096', '2048', 'thumb')),
      width integer not null constraint plate_versions_width_positive check (width > 0),
      height integer not null constraint plate_versions_height_positive check (height > 0),
      bytes integer not null constraint plate_versions_bytes_positive check (bytes > 0),
      media_type text not null constraint plate_versions_media_type_known check (media_type in ('image/jpeg', 'image/webp')),
      object_key text not null,
      constraint plate_versions_pkey primary key (plate_id, name),
      constraint plate_versions_plate_fkey
        foreign key (crew_id, plate_id) references plates (crew_id, id) on delete cascade
    );
    create index plate_versions_object_index on plate_versions (object_key);

    create table moves (
      id uuid constraint moves_pkey primary key,
      crew_id uuid not null constraint moves_crew_fkey references crews (id) on delete cascade,
      shot_id uuid not null,
      title text not null constraint moves_title_length check (char_length(title) <= 200),
      key_count integer not null constraint moves_key_count_range check (key_count between 1 and 2000),
      document jsonb not null,
      revision integer not null default 1 constraint moves_revision_positive check (revision > 0),
      updated_by uuid not null constraint moves_updated_by_fkey references users (id),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      deleted_at timestamptz,
      constraint moves_crew_id_unique unique (crew_id, id),
      constraint moves_shot_fkey foreign key (crew_id, shot_id) references shots (crew_id, id) on delete cascade,
      constraint moves_document_matches check (
        document ->> 'format' = 'fairlead.move' and document ->> 'title' = title
        and jsonb_array_length(document -> 'keys') = key_count
      )
    );
    create index moves_shot_index on moves (crew_id, shot_id, updated_at);
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table moves, plate_versions, plates, shots, shoots');
}
