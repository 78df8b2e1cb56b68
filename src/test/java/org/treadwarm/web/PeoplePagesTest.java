package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.URI;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.treadwarm.store.Person;
import org.treadwarm.store.Role;

/** Invitations, roles, new passwords and closed accounts, by forms. */
class PeoplePagesTest {
    private RunningServer server;
    private Person boss;
    private Visitor owner;

    @BeforeEach
    void start() {
        server = RunningServer.start();
        boss = server.owner();
        owner = new Visitor(server, server.session(boss));
    }

    @AfterEach
    void stop() {
        server.close();
    }

    /** The path of the link that a page shows. */
    private static String link(Page page) {
        return page.all("code")
                .filter(code -> code.getAttribute("class").equals("secret"))
                .map(code -> URI.create(code.getTextContent()).getPath())
                .findFirst()
                .orElseThrow();
    }

    private Page invite(String name, String role) {
        return owner.send(owner.open("/people").form("name").type("name", name).type("role", role));
    }

    private static Form typed(Page page, String password) {
        return page.form("again").type("password", password).type("again", password);
    }

    private Form button(String action) {
        return owner.open("/people").form("csrf").to(action);
    }

    @Test
    void anInvitedPersonChoosesAPasswordOnce() {
        Page made = invite("Emmet", "estimator");
        String link = link(made);
        assertThat(made.text()).contains(server.origin() + link);
        assertThat(owner.open("/people").text()).doesNotContain(link).contains("to join as estimator");

        Visitor late = new Visitor(server);
        Page lateForm = late.open(link);
        Visitor invited = new Visitor(server);
        Page form = invited.open(link);
        assertThat(form.value("name")).isEqualTo("Emmet");
        Page bad = invited.send(typed(form, "short").type("name", "Emmet Q"));
        assertThat(bad.status()).isEqualTo(422);
        assertThat(bad.value("name")).isEqualTo("Emmet Q");
        assertThat(bad.all("a").map(a -> a.getAttribute("href"))).contains("#password");
        Page taken = invited.send(typed(form, "a long enough one").type("name", RunningServer.OWNER));
        assertThat(taken.status()).isEqualTo(422);
        Page joined = invited.send(typed(form, "a long enough one"));
        assertThat(joined.location()).isEqualTo("/jobs");
        assertThat(invited.open("/jobs").has("name")).isTrue();
        assertThat(invited.open("/people").status()).isEqualTo(403);

        assertThat(new Visitor(server).open(link).status()).isEqualTo(404);
        assertThat(late.send(typed(lateForm, "a long enough one").type("name", "Late"))
                        .status())
                .isEqualTo(404);
        assertThat(owner.open("/people").text()).contains("Emmet").doesNotContain("to join as");
    }

    @Test
    void aBadInvitationIsToldAndKept() {
        Page bad = invite(" ", "owner");
        assertThat(bad.status()).isEqualTo(422);
        assertThat(bad.value("role")).isNotEmpty();
        assertThat(bad.all("a").map(a -> a.getAttribute("href"))).contains("#name");
        Page forged = invite("Emmet", "king");
        assertThat(forged.status()).isEqualTo(422);
        assertThat(forged.form("name").value("name")).isEqualTo("Emmet");
        assertThat(server.store().links().list()).isEmpty();
    }

    @Test
    void aRevokedInvitationIsShut() {
        String link = link(invite("Emmet", "surveyor"));
        String id = server.store().links().list().get(0).id();

        Page revoked = owner.send(button("/people/links/" + id + "/revoke"));
        assertThat(owner.open(revoked.location()).text()).contains("no longer works");

        assertThat(new Visitor(server).open(link).status()).isEqualTo(404);
        assertThat(owner.send(button("/people/links/" + id + "/revoke")).status())
                .isEqualTo(404);
    }

    @Test
    void aSurveyorEditsAndStartsNothing() {
        Visitor surveyor = new Visitor(server, server.session(server.member("Silvie", Role.SURVEYOR)));
        String job = "/jobs/" + server.job("yard", RunningServer.studio()).id();

        assertThat(surveyor.open("/jobs").has("name")).isFalse();
        assertThat(surveyor.open("/one-room").all("button")).noneMatch(button -> button.hasAttribute("formaction"));
        Page room = surveyor.open(job + "/rooms/studio-1");
        assertThat(surveyor.send(room.form("revision")
                                .type("/rooms/0/height", "2.5 m")
                                .press("save"))
                        .status())
                .isEqualTo(303);
        Page refused =
                surveyor.send(surveyor.open("/account").form("csrf").to("/jobs").forge("name", "mine"));
        assertThat(refused.status()).isEqualTo(403);
        assertThat(refused.text()).contains("role estimator");
        assertThat(server.desk().list()).hasSize(1);
    }

    @Test
    void aRoleIsChangedAndTheLastOwnerKept() {
        Person emmet = server.member("Emmet", Role.SURVEYOR);
        Form form = owner.open("/people").form("csrf");

        Page last = owner.send(form.to("/people/" + boss.id() + "/role").forge("role", "surveyor"));
        assertThat(last.status()).isEqualTo(422);
        assertThat(last.all("a").map(a -> a.getAttribute("href"))).contains("#role-" + boss.id());
        assertThat(last.id("role-" + boss.id())).isPresent();
        assertThat(owner.send(form.to("/people/" + boss.id() + "/close")).status())
                .isEqualTo(422);
        assertThat(owner.send(form.to("/people/" + emmet.id() + "/role").forge("role", "king"))
                        .status())
                .isEqualTo(422);

        assertThat(owner.send(form.to("/people/" + emmet.id() + "/role").forge("role", "owner"))
                        .location())
                .isEqualTo("/people?done=role");
        assertThat(owner.send(form.to("/people/" + boss.id() + "/role").forge("role", "estimator"))
                        .location())
                .isEqualTo("/account");
        assertThat(owner.open("/people").status()).isEqualTo(403);
    }

    @Test
    void aClosedAccountIsOutAtOnce() {
        Person emmet = server.member("Emmet", Role.ESTIMATOR);
        Visitor visitor = new Visitor(server, server.session(emmet));
        assertThat(visitor.open("/jobs").status()).isEqualTo(200);

        Page page = owner.submit(button("/people/" + emmet.id() + "/close"));

        assertThat(page.text()).contains("Closed accounts");
        assertThat(visitor.open("/jobs").location()).startsWith("/sign-in");
        assertThat(owner.send(button("/people/" + emmet.id() + "/close")).status())
                .isEqualTo(404);
    }

    @Test
    void aLinkForANewPasswordLetsSomebodyBackIn() {
        Person emmet = server.member("Emmet", Role.ESTIMATOR);
        String link = link(owner.send(button("/people/" + emmet.id() + "/password")));
        Visitor visitor = new Visitor(server);

        Page form = visitor.open(link);
        assertThat(form.text()).contains("Emmet");
        assertThat(visitor.send(typed(form, "a brand new sentence")).location()).isEqualTo("/jobs");

        Visitor later = new Visitor(server);
        assertThat(later.send(later.open("/sign-in")
                                .form("password")
                                .type("name", "Emmet")
                                .type("password", "a brand new sentence"))
                        .status())
                .isEqualTo(303);
    }

    @Test
    void theAuditListShowsItPageByPage() {
        for (int i = 0; i < 60; i++) {
            server.store().audit().append("tests", "counted", "number " + i);
        }
        server.member("Emmet", Role.ESTIMATOR);

        Page first = owner.open("/audit");
        assertThat(first.text())
                .contains("joined", "invited", "number 59", "Older entries")
                .doesNotContain("number 5<");
        String older = first.all("a")
                .map(a -> a.getAttribute("href"))
                .filter(href -> href.startsWith("/audit?"))
                .findFirst()
                .orElseThrow();
        Page second = owner.open(older);
        assertThat(second.text()).contains("number 5<", "created the owner").doesNotContain("number 59");
        assertThat(owner.open("/audit?before=x").status()).isEqualTo(404);
        assertThat(owner.open("/audit?before=999999999999999999").status()).isEqualTo(200);
    }
}
