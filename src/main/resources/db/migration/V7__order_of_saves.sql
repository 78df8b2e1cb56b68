-- Every revision gets the number of its save, counted over all jobs, and every job that of its last one. A list of jobs goes
-- by them: what was saved after a list began has a higher number than all that the list tells, so nobody's save moves a job
-- within it. Older revisions are numbered in the order of their times.
alter table revision add column save_number bigint;

update revision set save_number = numbered.place from (
    select job_id as job, revision as n, row_number() over (order by saved_at, job_id, revision) as place from revision
) numbered where job_id = numbered.job and revision = numbered.n;

create unique index revision_save_number on revision (save_number);

alter table job add column last_save bigint;

update job set last_save = (select max(save_number) from revision where revision.job_id = job.id);

create unique index job_last_save on job (last_save);

-- The list no longer goes by the time of the save.
drop index revision_saved_at;
