-- Times are ISO-8601 UTC text with milliseconds, so that text order is time order.

create table job (
    id varchar(12) primary key,
    created_at varchar(24) not null
);

create table piece (
    sha256 varchar(64) primary key,
    body text not null
);

create table manifest (
    sha256 varchar(64) primary key,
    body text not null
);

create table revision (
    job_id varchar(12) not null references job (id),
    revision bigint not null check (revision >= 1),
    name text not null,
    draft integer not null check (draft in (0, 1)),
    manifest_sha256 varchar(64) not null references manifest (sha256),
    saved_at varchar(24) not null,
    saved_by text not null,
    note text not null,
    primary key (job_id, revision)
);

create table person (
    id varchar(12) primary key,
    name text not null,
    name_key varchar(320) not null unique,
    role varchar(16) not null,
    password_hash text not null,
    created_at varchar(24) not null
);

create table owner_invitation (
    sha256 varchar(64) primary key,
    expires_at varchar(24) not null
);

create table sign_in_failure (
    name_sha256 varchar(64) primary key,
    failures integer not null,
    not_before varchar(24) not null,
    last_at varchar(24) not null
);

create index sign_in_failure_last_at on sign_in_failure (last_at);

create table session (
    sha256 varchar(64) primary key,
    person_id varchar(12) not null references person (id),
    created_at varchar(24) not null,
    last_seen_at varchar(24) not null
);

create table api_key (
    id varchar(12) primary key,
    name text not null,
    scope varchar(16) not null,
    sha256 varchar(64) not null unique,
    created_at varchar(24) not null,
    last_used_at varchar(24)
);

create table audit (
    number bigint primary key,
    happened_at varchar(24) not null,
    who text not null,
    what text not null,
    subject text not null
);
