package org.treadwarm.web;

import static io.restassured.RestAssured.given;

import io.restassured.config.EncoderConfig;
import io.restassured.config.RestAssuredConfig;
import io.restassured.http.ContentType;
import io.restassured.specification.RequestSpecification;
import org.treadwarm.store.Scope;

/** Requests to the API of a server; every answer is held to the server's own description. */
final class ApiClient {
    private static final RestAssuredConfig CONFIG = RestAssuredConfig.config()
            .encoderConfig(EncoderConfig.encoderConfig()
                    .defaultContentCharset("UTF-8")
                    .appendDefaultContentCharsetToContentTypeIfUndefined(false));

    private final RunningServer server;
    private final ContractFilter filter;

    ApiClient(RunningServer server) {
        this.server = server;
        byte[] description =
                given().baseUri(server.origin()).get("/api/v1/openapi.json").asByteArray();
        this.filter = new ContractFilter(new Contract(description));
    }

    /** A request without a key. */
    RequestSpecification anyone() {
        return given().config(CONFIG)
                .baseUri(server.origin())
                .basePath("/api/v1")
                .filter(filter);
    }

    /** A request with a key of this scope. */
    RequestSpecification with(Scope scope) {
        return anyone().auth().none().header("Authorization", "Bearer " + server.key(scope));
    }

    /** A request with a key of this scope and a JSON body. */
    RequestSpecification json(Scope scope, Object body) {
        return with(scope).contentType(ContentType.JSON).body(body.toString());
    }
}
