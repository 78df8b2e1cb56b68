package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.treadwarm.store.PasswordRule;
import org.treadwarm.store.PersonName;

/** What is wrong with a short form: for the summary, and beside each field. */
final class FormErrors {
    private static final String NAME_RULE =
            "A name has 1 to " + PersonName.MAXIMUM_LENGTH + " characters, all on one line.";
    private static final String PASSWORD_RULE =
            "A password has " + PasswordRule.MINIMUM_LENGTH + " to " + PasswordRule.MAXIMUM_LENGTH + " characters.";

    private final List<ErrorView> errors = new ArrayList<>();

    FormErrors add(String field, String message) {
        errors.add(new ErrorView(field, "", message, ""));
        return this;
    }

    FormErrors checkName(String field, String name) {
        return PersonName.accepts(name) ? this : add(field, NAME_RULE);
    }

    FormErrors checkPassword(String password, String again) {
        if (!PasswordRule.accepts(password)) {
            add("password", PASSWORD_RULE);
        }
        return password.equals(again) ? this : add("again", "The two passwords are not the same.");
    }

    boolean isEmpty() {
        return errors.isEmpty();
    }

    /** What a page needs to show them. */
    Map<String, Object> model() {
        Map<String, String> wrong = new HashMap<>();
        errors.forEach(error -> wrong.putIfAbsent(error.target(), error.message()));
        Map<String, Object> model = new HashMap<>();
        model.put("errors", List.copyOf(errors));
        model.put("wrong", wrong);
        return model;
    }
}
