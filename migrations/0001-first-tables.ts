import { Migration } from '@mikro-orm/migrations';

/** Accounts, shops, projects with their job documents, and what people say of them. */
export class FirstTables extends Migration {
  override up(): void {
    this.addSql(`
      create table shops (
        id uuid not null,
        name varchar(80) not null,
        created_at timestamptz(3) not null,
        constraint shops_pkey primary key (id)
      )
    `);
    this.addSql(`
      create table shop_cutters (
        id uuid not null,
        shop_id uuid not null,
        number int not null,
        cutter jsonb not null,
        constraint shop_cutters_pkey primary key (id)
      )
    `);
    this.addSql(
      `alter table shop_cutters add constraint shop_cutters_number_unique unique (shop_id, number)`,
    );
    this.addSql(`
      create table sign_in_failures (
        id uuid not null,
        account varchar(64) not null,
        device uuid null,
        address varchar(64) not null,
        at timestamptz(3) not null,
        constraint sign_in_failures_pkey primary key (id)
      )
    `);
    this.addSql(`create index sign_in_failures_account_index on sign_in_failures (account, at)`);
    this.addSql(`create index sign_in_failures_address_index on sign_in_failures (address, at)`);
    this.addSql(`create index sign_in_failures_at_index on sign_in_failures (at)`);
    this.addSql(`
      create table users (
        id uuid not null,
        email varchar(254) not null,
        name varchar(80) not null,
        password_hash text not null,
        created_at timestamptz(3) not null,
        constraint users_pkey primary key (id)
      )
    `);
    this.addSql(`alter table users add constraint users_email_unique unique (email)`);
    this.addSql(`
      create table sessions (
        id uuid not null,
        user_id uuid not null,
        device varchar(200) not null,
        created_at timestamptz(3) not null,
        last_seen_at timestamptz(3) not null,
        expires_at timestamptz(3) not null,
        revoked_at timestamptz(3) null,
        constraint sessions_pkey primary key (id)
      )
    `);
    this.addSql(`create index sessions_user_index on sessions (user_id, last_seen_at)`);
    this.addSql(`
      create table projects (
        id uuid not null,
        name varchar(200) not null,
        state text check (state in ('draft', 'in-review', 'approved', 'cut')) not null default 'draft',
        owner_id uuid not null,
        shop_id uuid null,
        job jsonb not null,
        version int not null,
        job_hash varchar(64) not null,
        board_x double precision not null,
        board_y double precision not null,
        board_z double precision not null,
        material varchar(80) not null,
        saved_at timestamptz(3) not null,
        saved_by_id uuid null,
        created_at timestamptz(3) not null,
        updated_at timestamptz(3) not null,
        deleted_at timestamptz(3) null,
        constraint projects_pkey primary key (id)
      )
    `);
    this.addSql(
      `create index projects_newest_index on projects (updated_at desc, id desc) where deleted_at is null`,
    );
    this.addSql(`
      create table revisions (
        id uuid not null,
        project_id uuid not null,
        number int not null,
        note text not null,
        job jsonb not null,
        job_hash varchar(64) not null,
        author_id uuid not null,
        created_at timestamptz(3) not null,
        constraint revisions_pkey primary key (id)
      )
    `);
    this.addSql(`alter table revisions add constraint revisions_number_unique unique (project_id, number)`);
    this.addSql(`
      create table project_members (
        project_id uuid not null,
        user_id uuid not null,
        role text check (role in ('owner', 'editor', 'reviewer')) not null,
        added_at timestamptz(3) not null,
        constraint project_members_pkey primary key (project_id, user_id)
      )
    `);
    this.addSql(`create index project_members_user_index on project_members (user_id, project_id)`);
    this.addSql(`
      create table memberships (
        shop_id uuid not null,
        user_id uuid not null,
        role text check (role in ('steward', 'maker', 'reviewer')) not null,
        added_at timestamptz(3) not null,
        constraint memberships_pkey primary key (shop_id, user_id)
      )
    `);
    this.addSql(`create index memberships_user_index on memberships (user_id)`);
    this.addSql(`
      create table comments (
        id uuid not null,
        project_id uuid not null,
        thread_id uuid null,
        author_id uuid not null,
        text text not null,
        pin jsonb null,
        job_version int not null,
        created_at timestamptz(3) not null,
        edited_at timestamptz(3) null,
        resolved_at timestamptz(3) null,
        resolved_by_id uuid null,
        deleted_at timestamptz(3) null,
        constraint comments_pkey primary key (id),
        constraint comments_pin_check check ((pin is null) = (thread_id is not null)),
        constraint comments_resolved_check check (resolved_at is null or thread_id is null)
      )
    `);
    this.addSql(`create index comments_project_index on comments (project_id, created_at)`);
    this.addSql(`create index comments_thread_index on comments (thread_id)`);
    this.addSql(
      `create index comments_open_index on comments (project_id) where thread_id is null and resolved_at is null and deleted_at is null`,
    );
    this.addSql(
      `alter table shop_cutters add constraint shop_cutters_shop_id_foreign foreign key (shop_id) references shops (id) on update cascade on delete cascade`,
    );
    this.addSql(
      `alter table sessions add constraint sessions_user_id_foreign foreign key (user_id) references users (id) on update cascade on delete cascade`,
    );
    this.addSql(
      `alter table projects add constraint projects_owner_id_foreign foreign key (owner_id) references users (id) on update cascade`,
    );
    this.addSql(
      `alter table projects add constraint projects_shop_id_foreign foreign key (shop_id) references shops (id) on update cascade on delete set null`,
    );
    this.addSql(
      `alter table projects add constraint projects_saved_by_id_foreign foreign key (saved_by_id) references users (id) on update cascade on delete set null`,
    );
    this.addSql(
      `alter table revisions add constraint revisions_project_id_foreign foreign key (project_id) references projects (id) on update cascade on delete cascade`,
    );
    this.addSql(
      `alter table revisions add constraint revisions_author_id_foreign foreign key (author_id) references users (id) on update cascade`,
    );
    this.addSql(
      `alter table project_members add constraint project_members_project_id_foreign foreign key (project_id) references projects (id) on update cascade on delete cascade`,
    );
    this.addSql(
      `alter table project_members add constraint project_members_user_id_foreign foreign key (user_id) references users (id) on update cascade on delete cascade`,
    );
    this.addSql(
      `alter table memberships add constraint memberships_shop_id_foreign foreign key (shop_id) references shops (id) on update cascade on delete cascade`,
    );
    this.addSql(
      `alter table memberships add constraint memberships_user_id_foreign foreign key (user_id) references users (id) on update cascade on delete cascade`,
    );
    this.addSql(
      `alter table comments add constraint comments_project_id_foreign foreign key (project_id) references projects (id) on update cascade on delete cascade`,
    );
    this.addSql(
      `alter table comments add constraint comments_author_id_foreign foreign key (author_id) references users (id) on update cascade`,
    );
    this.addSql(
      `alter table comments add constraint comments_resolved_by_id_foreign foreign key (resolved_by_id) references users (id) on update cascade on delete set null`,
    );
    this.addSql(
      `alter table comments add constraint comments_thread_id_foreign foreign key (thread_id) references comments (id) on update cascade on delete cascade`,
    );
  }

  override down(): void {
    for (const table of TABLES) this.addSql(`drop table ${table} cascade`);
  }
}

const TABLES = [
  'comments',
  'revisions',
  'project_members',
  'projects',
  'shop_cutters',
  'memberships',
  'shops',
  'sign_in_failures',
  'sessions',
  'users',
];
