alter table person add column closed_at varchar(24);
alter table person add column last_seen_at varchar(24);

alter table api_key add column expires_at varchar(24);
alter table api_key add column revoked_at varchar(24);

-- A link that makes a new account (it has a role) or gives an account a new password (it has a person).
create table one_time_link (
    id varchar(12) primary key,
    sha256 varchar(64) not null unique,
    for_whom text not null,
    role varchar(16),
    person_id varchar(12) references person (id),
    made_by text not null,
    made_at varchar(24) not null,
    expires_at varchar(24) not null,
    check ((role is null) <> (person_id is null))
);

drop table sign_in_failure;

-- Tries under one name from one address; an empty name stands for all names tried from the address.
create table sign_in_try (
    name_sha256 varchar(64) not null,
    address_sha256 varchar(64) not null,
    tries integer not null,
    not_before varchar(24) not null,
    last_at varchar(24) not null,
    primary key (name_sha256, address_sha256)
);

create index sign_in_try_last_at on sign_in_try (last_at);
create index session_person on session (person_id);
