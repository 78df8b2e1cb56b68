package org.treadwarm.store;

import java.time.Clock;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.Handle;

/** Everybody who has, or had, an account. One owner at least is always left. */
public final class Team {
    private final Database database;
    private final Audit audit;
    private final Clock clock;

    Team(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
    }

    /** All people by name, those with open accounts first. */
    public List<Member> list() {
        return database.read(handle -> handle.createQuery(
                        "select id, name, role, created_at, last_seen_at, closed_at from person"
                                + " order by case when closed_at is null then 0 else 1 end, name_key")
                .map((row, context) -> new Member(
                        PersonRows.person(row),
                        Optional.ofNullable(row.getString("last_seen_at")).map(Times::instant),
                        Optional.ofNullable(row.getString("closed_at")).map(Times::instant)))
                .list());
    }

    /** Gives somebody another role, from the next request on. Without effect where it is the same. */
    public TeamChange changeRole(String id, Role role, String who) {
        return database.change(handle -> {
            lockOwners(handle);
            Optional<Person> found = person(handle, id);
            if (found.isEmpty()) {
                return new TeamChange.Missing();
            }
            Person before = found.get();
            if (before.role() == role) {
                return new TeamChange.Done(before);
            }
            if (isLastOwner(handle, before)) {
                return new TeamChange.LastOwner();
            }
            handle.createUpdate("update person set role = :role where id = :id")
                    .bind("role", role.text())
                    .bind("id", id)
                    .execute();
            String roles = " from " + before.role().text() + " to " + role.text();
            audit.append(handle, who, "changed role", before.name() + roles);
            return new TeamChange.Done(new Person(id, before.name(), role, before.createdAt()));
        });
    }

    /** Closes an account: its sessions and links end, and it cannot be signed in to. What the person did stays. */
    public TeamChange close(String id, String who) {
        return database.change(handle -> {
            lockOwners(handle);
            Optional<Person> found = person(handle, id);
            if (found.isEmpty()) {
                return new TeamChange.Missing();
            }
            if (isLastOwner(handle, found.get())) {
                return new TeamChange.LastOwner();
            }
            handle.createUpdate("update person set closed_at = :now where id = :id")
                    .bind("now", Times.text(Times.now(clock)))
                    .bind("id", id)
                    .execute();
            handle.execute("delete from session where person_id = ?", id);
            handle.execute("delete from one_time_link where person_id = ?", id);
            audit.append(handle, who, "closed account", found.get().name());
            return new TeamChange.Done(found.get());
        });
    }

    /** Where transactions run side by side, two owners could else close one another in the same moment. */
    private static void lockOwners(Handle handle) {
        handle.execute("update person set role = role where role = ?", Role.OWNER.text());
    }

    private static Optional<Person> person(Handle handle, String id) {
        return PersonRows.byId(handle, id).map(PersonRows.Account::person);
    }

    private static boolean isLastOwner(Handle handle, Person person) {
        return person.role() == Role.OWNER
                && handle.createQuery("select count(*) from person"
                                        + " where role = :role and closed_at is null and id <> :id")
                                .bind("role", Role.OWNER.text())
                                .bind("id", person.id())
                                .mapTo(Integer.class)
                                .one()
                        == 0;
    }
}
