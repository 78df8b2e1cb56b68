-- Answers to requests that created something, under the name that the client gave the request, so that the same request
-- sent again creates nothing.
create table kept_answer (
    key_id varchar(12) not null references api_key (id),
    request_name varchar(255) not null,
    request_sha256 varchar(64) not null,
    status integer not null,
    location text not null,
    etag text not null,
    body text not null,
    made_at varchar(24) not null,
    primary key (key_id, request_name)
);

create index kept_answer_made_at on kept_answer (made_at);

-- The list of jobs is read page by page in this order.
create index revision_saved_at on revision (saved_at, job_id);
