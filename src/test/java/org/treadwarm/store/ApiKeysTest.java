package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class ApiKeysTest {
    @Parameter
    Kind kind;

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private DataHome home;
    private Store store;
    private ApiKeys keys;

    @BeforeEach
    void open() {
        home = kind.emptyHome(folder);
        store = Store.open(home, clock);
        keys = store.keys();
    }

    @AfterEach
    void close() {
        store.close();
    }

    @Test
    void findsAKeyByItsToken() {
        NewApiKey created = keys.create("spreadsheet", Scope.READ, "Anna");

        assertThat(created.token()).matches("tw_[A-Za-z0-9_-]{43}");
        assertThat(created.toString()).doesNotContain(created.token());
        assertThat(keys.list()).containsExactly(created.key());
        assertThat(created.key().lastUsed()).isEmpty();
        assertThat(keys.find(created.token())).map(ApiKey::scope).contains(Scope.READ);
        assertThat(keys.find("tw_guess")).isEmpty();
        assertThat(new DataFile(home).text("select sha256 from api_key")).isEqualTo(Secrets.sha256(created.token()));
    }

    @Test
    void notesUsesToTheMinute() {
        NewApiKey created = keys.create("spreadsheet", Scope.READ, "Anna");
        keys.find(created.token());
        Optional<Instant> first = Optional.of(clock.instant());
        clock.pass(Duration.ofMillis(59_999));
        keys.find(created.token());
        assertThat(keys.list()).extracting(ApiKey::lastUsed).containsExactly(first);

        clock.pass(Duration.ofMillis(1));
        assertThat(keys.find(created.token())).map(ApiKey::lastUsed).contains(Optional.of(clock.instant()));
        assertThat(keys.list()).extracting(ApiKey::lastUsed).containsExactly(Optional.of(clock.instant()));
    }

    @Test
    void aRevokedKeyIsGone() {
        NewApiKey kept = keys.create("kept", Scope.SIZE, "Anna");
        NewApiKey revoked = keys.create("revoked", Scope.WRITE, "Anna");

        assertThat(keys.revoke(revoked.key().id(), "Anna")).isTrue();
        assertThat(keys.revoke(revoked.key().id(), "Anna")).isFalse();

        assertThat(keys.find(revoked.token())).isEmpty();
        assertThat(keys.list()).extracting(ApiKey::name).containsExactly("kept");
        assertThat(keys.find(kept.token())).isPresent();
    }

    @Test
    void aScopeIncludesTheLesserOnes() {
        assertThat(Scope.WRITE.allows(Scope.READ)).isTrue();
        assertThat(Scope.READ.allows(Scope.READ)).isTrue();
        assertThat(Scope.READ.allows(Scope.SIZE)).isTrue();
        assertThat(Scope.READ.allows(Scope.WRITE)).isFalse();
        assertThat(Scope.SIZE.allows(Scope.READ)).isFalse();
    }
}
