package org.treadwarm.web.pages;

import io.javalin.http.Context;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.thymeleaf.TemplateEngine;
import org.thymeleaf.templatemode.TemplateMode;
import org.thymeleaf.templateresolver.ClassLoaderTemplateResolver;
import org.treadwarm.store.Role;
import org.treadwarm.store.Session;
import org.treadwarm.web.security.Visitors;

/** Renders templates with what every page needs: who is signed in, and the secret of its forms. */
final class View {
    private final TemplateEngine engine = new TemplateEngine();
    private final Visitors visitors;

    View(Visitors visitors) {
        this.visitors = visitors;
        ClassLoaderTemplateResolver resolver = new ClassLoaderTemplateResolver(View.class.getClassLoader());
        resolver.setPrefix("templates/");
        resolver.setSuffix(".html");
        resolver.setTemplateMode(TemplateMode.HTML);
        resolver.setCharacterEncoding("UTF-8");
        resolver.setCacheable(true);
        engine.setTemplateResolver(resolver);
    }

    /** Answers with a page. */
    void show(Context ctx, int status, String template, Map<String, Object> model) {
        Map<String, Object> all = new HashMap<>(model);
        all.put("csrf", visitors.formSecret(ctx));
        all.put("person", visitors.session(ctx).map(Session::person).orElse(null));
        all.put("isOwner", may(ctx, Role.OWNER));
        all.put("mayStartJobs", may(ctx, Role.ESTIMATOR));
        all.put("path", ctx.path());
        ctx.status(status);
        ctx.contentType("text/html; charset=utf-8");
        ctx.result(engine.process(template, new org.thymeleaf.context.Context(Locale.ENGLISH, all)));
    }

    /** A fragment of a template, for a page to hold or a script to ask for. */
    String fragment(String template, Map<String, Object> model) {
        return engine.process(template, Set.of(template), new org.thymeleaf.context.Context(Locale.ENGLISH, model));
    }

    private boolean may(Context ctx, Role least) {
        return visitors.session(ctx)
                .filter(session -> session.person().role().allows(least))
                .isPresent();
    }
}
