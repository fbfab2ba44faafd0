import { Migration } from '@mikro-orm/migrations';

/** Every save kept, named revisions with their files, and what of them can no longer change. */
export class Migration004Revisions extends Migration {
  override up(): void {
    this.addSql(`
      create table design_versions (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        design_id uuid not null,
        version int not null,
        name varchar(80) not null,
        parameters jsonb not null,
        parameters_format int not null,
        kernel varchar(20) not null,
        checks jsonb not null,
        saved_by_id uuid not null,
        constraint design_versions_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint design_versions_design_id_foreign
          foreign key (design_id) references designs on update cascade,
        constraint design_versions_saved_by_id_foreign
          foreign key (saved_by_id) references users on update cascade,
        constraint design_versions_design_id_version_unique unique (design_id, version)
      )`);
    // What stands now is the first that is kept.
    this.addSql(`
      insert into design_versions
        select gen_random_uuid(), updated_at, workshop_id, id, version, name, parameters,
          parameters_format, kernel, checks, updated_by_id from designs`);

    this.addSql(`
      create table revisions (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        design_id uuid not null,
        number int not null,
        name varchar(80) not null,
        note varchar(500) not null,
        design_name varchar(80) not null,
        version int not null,
        parameters jsonb not null,
        parameters_format int not null,
        kernel varchar(20) not null,
        checks jsonb not null,
        derivation jsonb not null,
        state text not null
          check (state in ('draft', 'in-review', 'released', 'superseded', 'withdrawn')),
        waivers jsonb not null,
        created_by_id uuid not null,
        review_asked_by_id uuid,
        released_by_id uuid,
        released_at timestamptz(3),
        withdrawn_by_id uuid,
        withdrawn_at timestamptz(3),
        withdrawn_reason varchar(500),
        updated_at timestamptz(3) not null,
        constraint revisions_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint revisions_design_id_foreign
          foreign key (design_id) references designs on update cascade,
        constraint revisions_created_by_id_foreign
          foreign key (created_by_id) references users on update cascade,
        constraint revisions_review_asked_by_id_foreign
          foreign key (review_asked_by_id) references users on update cascade on delete set null,
        constraint revisions_released_by_id_foreign
          foreign key (released_by_id) references users on update cascade on delete set null,
        constraint revisions_withdrawn_by_id_foreign
          foreign key (withdrawn_by_id) references users on update cascade on delete set null,
        constraint revisions_design_id_number_unique unique (design_id, number)
      )`);
    this.addSql(
      'create index revisions_workshop_id_state_index on revisions (workshop_id, state)',
    );
    // At most one revision of a design is the one to cut.
    this.addSql(`
      create unique index revisions_one_released on revisions (design_id)
        where state = 'released'`);

    this.addSql(`
      create table revision_files (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        revision_id uuid not null,
        position int not null,
        name varchar(200) not null,
        label varchar(200) not null,
        kind varchar(10) not null,
        media_type varchar(100) not null,
        bytes int not null,
        sha256 varchar(64) not null,
        body bytea not null,
        constraint revision_files_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint revision_files_revision_id_foreign
          foreign key (revision_id) references revisions on update cascade,
        constraint revision_files_revision_id_name_unique unique (revision_id, name)
      )`);

    this.addSql(`
      create function refuse_kept_change() returns trigger language plpgsql as $$
      begin
        raise exception '% are kept as they are; % refused', tg_table_name, tg_op;
      end $$`);
    this.addSql(`
      create trigger design_versions_kept before update or delete or truncate on design_versions
        for each statement execute function refuse_kept_change()`);

    // A revision moves from state to state, forwards; all else in it is frozen.
    this.addSql(`
      create function refuse_revision_change() returns trigger language plpgsql as $$
      begin
        if tg_op = 'DELETE' then
          raise exception 'revisions are kept as they are; DELETE refused';
        end if;
        if row(new.id, new.created_at, new.workshop_id, new.design_id, new.number, new.name,
            new.note, new.design_name, new.version, new.parameters, new.parameters_format,
            new.kernel, new.checks, new.derivation, new.created_by_id)
          is distinct from row(old.id, old.created_at, old.workshop_id, old.design_id,
            old.number, old.name, old.note, old.design_name, old.version, old.parameters,
            old.parameters_format, old.kernel, old.checks, old.derivation, old.created_by_id)
        then
          raise exception 'revision % is frozen; only its state moves', old.number;
        end if;
        if old.state in ('released', 'superseded', 'withdrawn')
          and row(new.waivers, new.released_by_id, new.released_at)
            is distinct from row(old.waivers, old.released_by_id, old.released_at)
        then
          raise exception 'revision % has been released; who did so and why stays', old.number;
        end if;
        if new.state <> old.state and (old.state, new.state) not in (('draft', 'in-review'),
          ('in-review', 'draft'), ('in-review', 'released'), ('released', 'superseded'),
          ('released', 'withdrawn'), ('superseded', 'withdrawn'))
        then
          raise exception 'revision % can not go from % to %', old.number, old.state, new.state;
        end if;
        return new;
      end $$`);
    this.addSql(`
      create trigger revisions_frozen before update or delete on revisions
        for each row execute function refuse_revision_change()`);

    // Files are written anew at release, with the release in the drawing; never after.
    this.addSql(`
      create function refuse_file_change() returns trigger language plpgsql as $$
      begin
        if tg_op = 'UPDATE' or exists (select 1 from revisions
          where id = coalesce(new.revision_id, old.revision_id)
            and state in ('released', 'superseded', 'withdrawn'))
        then
          raise exception 'files of a released revision are fixed; % refused', tg_op;
        end if;
        return coalesce(new, old);
      end $$`);
    this.addSql(`
      create trigger revision_files_fixed before insert or update or delete on revision_files
        for each row execute function refuse_file_change()`);
  }

  override down(): void {
    this.addSql('drop table revision_files, revisions, design_versions');
    this.addSql('drop function refuse_file_change, refuse_revision_change, refuse_kept_change');
  }
}
