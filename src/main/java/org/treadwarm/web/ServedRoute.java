package org.treadwarm.web;

import io.javalin.Javalin;
import io.javalin.router.Endpoint;
import io.javalin.security.Roles;
import java.util.List;
import java.util.Set;
import org.treadwarm.web.security.Access;

/** A route as the server itself lists it. */
record ServedRoute(String method, String path, Access access) {
    /**
     * All routes.
     *
     * @throws IllegalStateException if one does not say, in one word, who may use it
     */
    static List<ServedRoute> of(Javalin javalin) {
        return javalin.unsafe.internalRouter.allHttpHandlers().stream()
                .map(parsed -> parsed.endpoint)
                .filter(endpoint -> endpoint.method.isHttpMethod())
                .map(ServedRoute::of)
                .toList();
    }

    private static ServedRoute of(Endpoint endpoint) {
        Roles roles = endpoint.metadata(Roles.class);
        Set<?> said = roles == null ? Set.of() : roles.getRoles();
        if (said.size() != 1 || !(said.iterator().next() instanceof Access access)) {
            throw new IllegalStateException(
                    "The route " + endpoint.method + " " + endpoint.path + " does not say who may use it");
        }
        return new ServedRoute(endpoint.method.name(), endpoint.path, access);
    }
}
