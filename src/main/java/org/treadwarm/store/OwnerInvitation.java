package org.treadwarm.store;

import java.time.Duration;
import java.time.Instant;
import org.jdbi.v3.core.Handle;

/** The one link through which the first account can be made. Only the digest of its token is kept. */
final class OwnerInvitation {
    private static final Duration VALID_FOR = Duration.ofHours(24);

    private OwnerInvitation() {}

    static String replace(Handle handle, Instant now) {
        String token = Secrets.token();
        handle.execute("delete from owner_invitation");
        handle.createUpdate("insert into owner_invitation (sha256, expires_at) values (:sha256, :expiresAt)")
                .bind("sha256", Secrets.sha256(token))
                .bind("expiresAt", Times.text(now.plus(VALID_FOR)))
                .execute();
        return token;
    }

    static boolean isOpen(Handle handle, String token, Instant now) {
        return handle.createQuery("select count(*) from owner_invitation where sha256 = :sha256 and expires_at > :now")
                        .bind("sha256", Secrets.sha256(token))
                        .bind("now", Times.text(now))
                        .mapTo(Integer.class)
                        .one()
                == 1;
    }

    /** Whether the token was good; it no longer is. */
    static boolean spend(Handle handle, String token, Instant now) {
        return handle.createUpdate("delete from owner_invitation where sha256 = :sha256 and expires_at > :now")
                        .bind("sha256", Secrets.sha256(token))
                        .bind("now", Times.text(now))
                        .execute()
                == 1;
    }
}
