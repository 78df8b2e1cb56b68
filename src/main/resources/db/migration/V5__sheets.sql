-- Issued sheets. Their rows are never changed or removed: the databases themselves refuse it.

create table sheet (
    number varchar(20) primary key,
    issue_year integer not null,
    running integer not null check (running >= 1),
    job_id varchar(12) not null,
    revision bigint not null,
    job_name text not null,
    method_version varchar(16) not null,
    survey text not null,
    sizing text not null,
    sha256 varchar(64) not null,
    issued_at varchar(24) not null,
    issued_by text not null,
    replaces varchar(20) unique references sheet (number),
    unique (issue_year, running),
    foreign key (job_id, revision) references revision (job_id, revision)
);

create index sheet_job on sheet (job_id);

create table sheet_withdrawal (
    number varchar(20) primary key references sheet (number),
    withdrawn_at varchar(24) not null,
    withdrawn_by text not null,
    reason text not null
);

-- A link that shows one sheet to whoever has it.
create table sheet_link (
    id varchar(12) primary key,
    number varchar(20) not null references sheet (number),
    sha256 varchar(64) not null unique,
    made_at varchar(24) not null,
    made_by text not null,
    revoked_at varchar(24)
);

create index sheet_link_number on sheet_link (number);

${keep_sheet}

${keep_sheet_withdrawal}
