package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Demo;
import org.treadwarm.jobs.Judgement;

/** Spaces settle at the same temperature whether or not the floors are solved. */
class SpaceBalanceTest {
    @Test
    void isWhatTheWholeSizingSays() {
        Judgement judged = Judgement.of(Demo.survey());

        assertThat(SpaceBalance.all(judged.survey().orElseThrow()))
                .isNotEmpty()
                .isEqualTo(judged.sizing().orElseThrow().spaces().stream()
                        .map(space -> new SpaceBalance(space.name(), space.temperature(), space.paths()))
                        .toList());
    }
}
