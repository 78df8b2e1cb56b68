package org.treadwarm.draw;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/** What a material is hatched as in a section. */
public enum MaterialFamily {
    // In this order, because the first family with a word in the name wins: "insulation board" insulates, "tile
    // adhesive" is no tile, "reinforced concrete with steel" is no metal and "air gap behind oak" is air.
    INSULATION(
            "insul",
            "wool",
            "eps",
            "xps",
            "polystyrene",
            "pur",
            "pir",
            "polyurethane",
            "phenolic",
            "cork",
            "cellulose",
            "foam",
            "woodwool",
            "stonewool",
            "glasswool",
            "aerogel",
            "perlite",
            "vermiculite",
            "mineral fibre",
            "fibreglass"),
    MEMBRANE(
            "membrane",
            "foil",
            "felt",
            "bitumen",
            "bituminous",
            "vapour",
            "vapor",
            "polyethylene",
            "film",
            "damp",
            "underlay",
            "waterproofing",
            "decoupling",
            "epdm"),
    AIR("air", "cavity", "void", "airspace"),
    BOARD(
            "board",
            "plasterboard",
            "chipboard",
            "osb",
            "plywood",
            "mdf",
            "fibreboard",
            "hardboard",
            "drywall",
            "particleboard"),
    BRICK_BLOCK("brick", "brickwork", "block", "blockwork", "masonry", "aac", "aerated"),
    CONCRETE_SCREED(
            "concrete",
            "screed",
            "mortar",
            "cement",
            "plaster",
            "render",
            "adhesive",
            "grout",
            "anhydrite",
            "gypsum",
            "levelling",
            "compound",
            "slab"),
    TILE(
            "tile",
            "tiles",
            "tiling",
            "ceramic",
            "porcelain",
            "stone",
            "slate",
            "marble",
            "granite",
            "terrazzo",
            "terracotta"),
    METAL("metal", "steel", "aluminium", "aluminum", "copper", "zinc", "iron", "lead"),
    GLASS("glass", "glazing", "pane"),
    TIMBER(
            "timber",
            "wood",
            "wooden",
            "softwood",
            "hardwood",
            "oak",
            "pine",
            "spruce",
            "parquet",
            "laminate",
            "joist",
            "joists",
            "stud",
            "studs",
            "rafter",
            "rafters",
            "batten",
            "battens"),
    GROUND("ground", "soil", "earth", "clay", "sand", "gravel", "hardcore", "ballast"),
    OTHER;

    private static final int SHORT_WORD = 4;

    private final List<String> words;

    MaterialFamily(String... words) {
        this.words = List.of(words);
    }

    /**
     * The family a material's name speaks of, by its words; {@link #OTHER} if none is known. Short words count only
     * where they stand alone ("air" not in "stair"); longer ones also within a word. The lists are common practice,
     * no source.
     */
    public static MaterialFamily of(String name) {
        String lower = name.toLowerCase(Locale.ROOT);
        List<String> parts = List.of(lower.split("[^\\p{L}]+"));
        return Arrays.stream(values())
                .filter(family -> family.words.stream().anyMatch(word -> speaksOf(lower, parts, word)))
                .findFirst()
                .orElse(OTHER);
    }

    private static boolean speaksOf(String name, List<String> parts, String word) {
        return word.length() <= SHORT_WORD ? parts.contains(word) : name.contains(word);
    }

    String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
