alter table job add column archived_at varchar(24);

-- What the job is found by, in small letters; none until it is saved or looked for by a program that writes it.
alter table job add column words text;
