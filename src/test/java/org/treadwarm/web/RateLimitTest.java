package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.endsWith;
import static org.hamcrest.Matchers.matchesPattern;
import static org.hamcrest.Matchers.nullValue;

import org.junit.jupiter.api.Test;
import org.treadwarm.store.Scope;

class RateLimitTest {
    @Test
    void aKeyThatAsksTooOftenIsToldWhenToComeBack() {
        try (RunningServer server = RunningServer.limited(3)) {
            ApiClient api = new ApiClient(server);
            for (int left = 2; left >= 0; left--) {
                api.with(Scope.READ)
                        .get("/jobs")
                        .then()
                        .statusCode(200)
                        .header("RateLimit-Policy", "\"key\";q=3;w=60")
                        .header("RateLimit", matchesPattern("\"key\";r=" + left + ";t=\\d+"));
            }
            String wait = api.with(Scope.READ)
                    .get("/jobs")
                    .then()
                    .statusCode(429)
                    .body("type", endsWith(":rate-limit"))
                    .extract()
                    .header("Retry-After");
            assertThat(Integer.parseInt(wait)).isBetween(1, 20);

            api.with(Scope.WRITE).get("/jobs").then().statusCode(200);
            api.anyone().get("/health").then().statusCode(200).header("RateLimit", nullValue());
        }
    }

    @Test
    void thereIsNoneUnlessAskedFor() {
        try (RunningServer server = RunningServer.start()) {
            new ApiClient(server).with(Scope.READ).get("/jobs").then().header("RateLimit-Policy", nullValue());
        }
    }
}
