package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Map;
import org.treadwarm.intake.Document;
import org.treadwarm.web.api.Api;
import org.treadwarm.web.security.Visitors;

/** The description of the API to read: what every route takes and answers. */
final class ContractPage {
    private final Visitors visitors;
    private final View view;

    ContractPage(Visitors visitors, View view) {
        this.visitors = visitors;
        this.view = view;
    }

    /** Read when the page is first shown. */
    private static final class Description {
        static final JsonNode TREE = read();

        private static JsonNode read() {
            try {
                return Document.mapper().readTree(Api.description());
            } catch (IOException e) {
                throw new UncheckedIOException("the description of the API cannot be read", e);
            }
        }
    }

    void show(Context ctx) {
        ContractView contract = new ContractView(Description.TREE);
        view.show(
                ctx,
                200,
                "api",
                Map.of(
                        "words",
                        Description.TREE.at("/info/description").asText(),
                        "keyWords",
                        Description.TREE
                                .at("/components/securitySchemes/key/description")
                                .asText(),
                        "address",
                        Api.ROOT + "/openapi.json",
                        "subjects",
                        contract.subjects(visitors.origin(ctx)),
                        "usual",
                        contract.usualAnswers(),
                        "documents",
                        contract.documents()));
    }
}
