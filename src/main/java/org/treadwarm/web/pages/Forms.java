package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.treadwarm.intake.Ranges;
import org.treadwarm.survey.AirGap;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Bridging;
import org.treadwarm.survey.FixedPart;
import org.treadwarm.survey.FloorPart;
import org.treadwarm.survey.Ground;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.HeatingMat;
import org.treadwarm.survey.Junction;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Opening;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Shape;
import org.treadwarm.survey.Space;
import org.treadwarm.survey.Surface;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.Word;
import org.treadwarm.units.Declared;
import org.treadwarm.web.pages.FieldView.Choice;
import org.treadwarm.web.pages.ObjectView.PartView;

/**
 * Makes forms from the document as it was typed, the shapes that read it, and the problems found in it. Labels, units, help
 * and ranges are those of the one declaration.
 */
final class Forms {
    private static final Set<String> SUSPENDED_ONLY =
            Set.of("floorHeight", "wallUValue", "ventArea", "windSpeed", "shielding");
    private static final Set<String> NOT_SHOWN = Set.of("id", "density", "specificHeat");
    private static final Set<Class<?>> WITHOUT_NAME = Set.of(
            AirGap.class,
            Bridging.class,
            Ground.class,
            HeatedFloor.class,
            org.treadwarm.survey.Heater.class,
            org.treadwarm.survey.Air.class,
            org.treadwarm.survey.Site.class,
            org.treadwarm.survey.RoomPlan.class,
            Assembly.class,
            Space.class);
    private static final Set<String> SELDOM = Set.of(
            "reheat",
            "allowance",
            "otherHeat",
            "remark",
            "reference",
            "surveyedBy",
            "surveyedOn",
            "altitude",
            "groundSeasonFactor",
            "groundwaterFactor",
            "dimensions",
            "insideCoefficient",
            "outsideCoefficient",
            "maximumTemperature",
            "glycol",
            "manifold",
            "manifoldDrop",
            "heatSourceDrop",
            "spacing");
    private static final Map<String, String> ADD = Map.ofEntries(
            Map.entry("surfaces", "Add a surface"),
            Map.entry("openings", "Add an opening"),
            Map.entry("junctions", "Add a junction"),
            Map.entry("layers", "Add a layer"),
            Map.entry("above", "Add a layer above"),
            Map.entry("below", "Add a layer below"),
            Map.entry("parts", "Add a part"),
            Map.entry("heatedFloor", "Add a heated floor"),
            Map.entry("airGap", "Make it an air gap"),
            Map.entry("bridging", "Add framing"),
            Map.entry("heater", "Add the heater"),
            Map.entry("mats", "Add a mat"),
            Map.entry("plan", "Add a plan of the floor"),
            Map.entry("fixed", "Add a fixed part"),
            Map.entry("air", "Add air"));
    private static final Map<Class<?>, String> ITEMS = Map.of(
            Surface.class, "Surface",
            Opening.class, "Opening",
            Junction.class, "Junction",
            FixedPart.class, "Fixed part",
            FloorPart.class, "Part",
            HeatingMat.class, "Mat");
    private static final Set<String> ALWAYS_OPEN = Set.of("air", "heater");

    private final JsonNode document;
    private final List<Problem> problems;
    private final Map<String, Problem> unplaced = new LinkedHashMap<>();
    private final List<ErrorView> errors = new ArrayList<>();

    Forms(JsonNode document, List<Problem> problems) {
        this.document = document;
        this.problems = problems;
    }

    /** The form of one object of the document. */
    ObjectView form(String pointer, String title, Class<? extends Record> type) {
        unplaced.clear();
        for (Problem problem : problems) {
            if (problem.pointer().equals(pointer) || problem.pointer().startsWith(pointer + "/")) {
                unplaced.put(problem.pointer(), problem);
            }
        }
        ObjectView view = object(document.at(pointer), pointer, "form", title, type, false);
        unplaced.values()
                .forEach(problem -> errors.add(new ErrorView(id(pointer), "", problem.message(), problem.allowed())));
        unplaced.clear();
        return view;
    }

    /** Some fields of the whole document, in the order of its shape; the other problems in it are left to the caller. */
    List<FieldView> fields(Class<? extends Record> type, Set<String> names, String owner) {
        problems.forEach(problem -> unplaced.put(problem.pointer(), problem));
        List<FieldView> fields = Shape.of(type).keys().values().stream()
                .filter(key -> names.contains(key.name()))
                .map(key -> field(document.path(key.name()), key, Pointer.to("", key.name()), owner))
                .toList();
        unplaced.clear();
        return fields;
    }

    /** The summary of what is wrong in the forms made so far. */
    List<ErrorView> errors() {
        return List.copyOf(errors);
    }

    /** The id in the page of an address. */
    static String id(String pointer) {
        StringBuilder id = new StringBuilder("f");
        for (int i = 0; i < pointer.length(); i++) {
            char c = pointer.charAt(i);
            if (c == '/') {
                id.append('-');
            } else if (c >= '0' && c <= '9' || c >= 'a' && c <= 'z' || c >= 'A' && c <= 'Z') {
                id.append(c);
            } else {
                id.append('_').append(Integer.toHexString(c));
            }
        }
        return id.toString();
    }

    private ObjectView object(
            JsonNode node, String pointer, String key, String title, Class<? extends Record> type, boolean removable) {
        List<FieldView> fields = new ArrayList<>();
        List<FieldView> more = new ArrayList<>();
        List<PartView> parts = new ArrayList<>();
        int before = errors.size();
        String error = takeError(pointer, title);
        for (Shape.Key each : Shape.of(type).keys().values()) {
            String at = Pointer.to(pointer, each.name());
            if (!isShown(each, type, node)) {
                continue;
            }
            if (each.holds() == Shape.Holds.OBJECT) {
                parts.add(part(node.path(each.name()), each, at));
            } else if (each.many() == Shape.Many.LIST) {
                for (int i = 0; i < 2; i++) {
                    fields.add(field(node.path(each.name()).path(i), each, Pointer.to(at, i), title));
                }
            } else {
                boolean seldom = SELDOM.contains(each.name())
                        && (type != FloorPart.class || each.name().equals("remark"));
                (seldom ? more : fields).add(field(node.path(each.name()), each, at, title));
            }
        }
        boolean wrong = errors.size() > before;
        return new ObjectView(
                pointer,
                id(pointer),
                key,
                title,
                Facts.of(node, type),
                List.copyOf(fields),
                List.copyOf(more),
                more.stream().anyMatch(Forms::isUsed),
                List.copyOf(parts),
                removable,
                error,
                wrong || isNew(node));
    }

    private static boolean isUsed(FieldView field) {
        boolean chosen = field.choices().stream()
                .anyMatch(choice -> choice.chosen() && field.choices().indexOf(choice) > 0);
        return !field.error().isEmpty()
                || field.choices().isEmpty() && !field.value().isEmpty()
                || chosen;
    }

    private static boolean isNew(JsonNode node) {
        return node.isEmpty() || node.size() == 1 && node.has("id");
    }

    private boolean isShown(Shape.Key key, Class<?> type, JsonNode node) {
        String name = key.name();
        if (NOT_SHOWN.contains(name) && type != org.treadwarm.survey.Heater.class) {
            return node.has(name) && !name.equals("id");
        }
        if ((name.equals("name") || name.equals("remark")) && WITHOUT_NAME.contains(type) && !node.has(name)) {
            return name.equals("remark") && (type == Assembly.class || type == Space.class);
        }
        if (type == Ground.class && SUSPENDED_ONLY.contains(name)) {
            return node.path("kind").asText().equals("suspended") || node.has(name);
        }
        if (name.equals("ground") && type == Surface.class) {
            return node.path("to").asText().equals(Survey.GROUND) || node.has(name);
        }
        if (name.equals("ground") && type == HeatedFloor.class) {
            return node.has(name);
        }
        if (name.equals("mats")) {
            return node.path("kind").asText().equals("electric") || node.has(name);
        }
        if (type == Space.class) {
            return isShownOfSpace(name, node);
        }
        boolean marks = type == Layer.class && name.equals("maximumTemperature");
        return !marks || node.has(name) || !node.has("bridging");
    }

    private static boolean isShownOfSpace(String name, JsonNode node) {
        boolean held = node.path("kind").asText().equals("held");
        boolean factor = node.has("temperatureFactor");
        return switch (name) {
            case "temperature" -> held || node.has(name);
            case "temperatureFactor" -> !held;
            case "surfaces", "junctions", "air" -> !held && !factor || node.has(name);
            default -> true;
        };
    }

    @SuppressWarnings("unchecked")
    private PartView part(JsonNode node, Shape.Key key, String pointer) {
        Class<? extends Record> type = (Class<? extends Record>) key.type();
        boolean list = key.many() == Shape.Many.LIST;
        List<ObjectView> items = new ArrayList<>();
        if (list) {
            for (int i = 0; node.isArray() && i < node.size(); i++) {
                String at = Pointer.to(pointer, i);
                items.add(object(node.get(i), at, key.name(), itemTitle(node.get(i), type, i), type, true));
            }
        } else if (!node.isMissingNode() || ALWAYS_OPEN.contains(key.name())) {
            items.add(object(node, pointer, key.name(), capital(key.label()), type, isRemovable(key)));
        }
        String add = list || items.isEmpty() ? ADD.getOrDefault(key.name(), "") : "";
        return new PartView(
                pointer,
                id(pointer),
                key.name(),
                capital(key.label()),
                List.copyOf(items),
                list,
                add,
                key.help(),
                takeError(pointer, capital(key.label())));
    }

    private static boolean isRemovable(Shape.Key key) {
        return !ALWAYS_OPEN.contains(key.name()) && !key.name().equals("ground");
    }

    private static String itemTitle(JsonNode node, Class<?> type, int i) {
        String what = ITEMS.getOrDefault(type, "Layer");
        for (String key : List.of("name", "assembly", "material")) {
            if (node.path(key).isTextual() && !node.path(key).textValue().isBlank()) {
                return what + " " + (i + 1) + ": " + node.path(key).textValue();
            }
        }
        return what + " " + (i + 1);
    }

    private FieldView field(JsonNode node, Shape.Key key, String pointer, String owner) {
        String id = id(pointer);
        String text = shown(node);
        String label = capital(key.label());
        if (key.holds() == Shape.Holds.QUANTITY) {
            Declared declared = key.quantity().orElseThrow();
            String unit = unit(declared);
            return new FieldView(
                    pointer,
                    id,
                    "quantity",
                    label,
                    unit,
                    FormData.withoutUnit(text, unit),
                    declared.help(),
                    Ranges.words(declared),
                    declared.fallback(),
                    takeError(pointer, owner + ": " + label),
                    basis(node),
                    declared.assume(),
                    declared.assumeWhy(),
                    List.of(),
                    "");
        }
        List<Choice> choices = choices(key, pointer, text);
        boolean isLong = key.name().equals("remark");
        return new FieldView(
                pointer,
                id,
                choices.isEmpty() ? isLong ? "long" : "text" : "choice",
                label,
                "",
                text,
                key.help(),
                "",
                choices.isEmpty() ? key.fallback() : "",
                takeError(pointer, owner + ": " + label),
                "",
                "",
                "",
                choices,
                key.name().equals("material") ? "materials" : "");
    }

    /** How a reading was come by, with its own remark. */
    private static String basis(JsonNode node) {
        String basis = node.path("basis").asText("");
        String remark = node.path("remark").asText("");
        return basis.isEmpty() || remark.isEmpty() ? basis : basis + ": " + remark;
    }

    /** The unit shown beside a field of a quantity. */
    static String unit(Declared declared) {
        return declared.formUnit().isEmpty() ? declared.kind().siUnit() : declared.formUnit();
    }

    private List<Choice> choices(Shape.Key key, String pointer, String chosen) {
        Map<String, String> words = new LinkedHashMap<>();
        if (key.holds() == Shape.Holds.WORD) {
            for (Word word : key.words()) {
                words.put(word.word(), word.label());
            }
        } else if (key.name().equals("assembly")) {
            document.path("assemblies").fieldNames().forEachRemaining(name -> words.put(name, name));
        } else if (key.name().equals("to")) {
            sides(pointer).forEach(side -> words.put(side, side));
        } else {
            return List.of();
        }
        String current = chosen.isEmpty() ? key.fallback() : chosen;
        if (pointer.endsWith("/heatedFloor/to") && chosen.isEmpty()) {
            JsonNode floor = document.at(pointer.substring(0, pointer.length() - 3));
            current = floor.has("ground") ? Survey.GROUND : "";
        }
        List<Choice> choices = new ArrayList<>();
        if (key.fallback().isEmpty()) {
            choices.add(new Choice("", "choose …", current.isEmpty()));
        }
        if (!current.isEmpty() && !words.containsKey(current)) {
            choices.add(new Choice(current, current + " (not known here)", true));
        }
        for (Map.Entry<String, String> word : words.entrySet()) {
            choices.add(new Choice(word.getKey(), word.getValue(), word.getKey().equals(current)));
        }
        return choices;
    }

    private Set<String> sides(String pointer) {
        Set<String> sides = new LinkedHashSet<>();
        sides.add(Survey.OUTDOORS);
        if (!pointer.contains("/junctions/")) {
            sides.add(Survey.GROUND);
        }
        document.path("spaces").fieldNames().forEachRemaining(sides::add);
        document.path("rooms").forEach(room -> sides.add(room.path("name").asText()));
        sides.remove(ownName(pointer));
        sides.remove("");
        return sides;
    }

    private String ownName(String pointer) {
        String[] parts = pointer.split("/");
        if (parts.length > 2 && parts[1].equals("rooms")) {
            return document.at("/rooms/" + parts[2] + "/name").asText();
        }
        return parts.length > 2 ? parts[2].replace("~1", "/").replace("~0", "~") : "";
    }

    /** The text of a node as it was typed. */
    static String shown(JsonNode node) {
        if (node.isMissingNode() || node.isNull()) {
            return "";
        }
        if (node.isObject() && node.has("reading")) {
            return shown(node.get("reading"));
        }
        return node.isTextual() ? node.textValue() : node.isContainerNode() ? "" : node.asText();
    }

    private String takeError(String pointer, String where) {
        Problem problem = unplaced.remove(pointer);
        for (String below : List.of("/reading", "/basis")) {
            Problem deeper = unplaced.remove(pointer + below);
            problem = problem == null ? deeper : problem;
        }
        if (problem == null) {
            return "";
        }
        errors.add(new ErrorView(id(pointer), where, sentence(problem.message()), problem.allowed()));
        return sentence(problem.message()) + " Allowed: " + problem.allowed() + ".";
    }

    private static String sentence(String message) {
        return capital(message) + (message.endsWith("?") || message.endsWith(".") ? "" : ".");
    }

    private static String capital(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }
}
