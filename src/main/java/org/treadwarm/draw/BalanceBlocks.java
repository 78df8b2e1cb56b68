package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Predicate;
import java.util.stream.Collectors;

/**
 * The two columns of a heat balance as blocks, each from the top.
 *
 * @param out by which paths heat goes out
 * @param in where it comes from
 * @param merged the names and numbers of the paths too small for a block of their own; empty if none
 */
record BalanceBlocks(List<Block> out, List<Block> in, String merged) {
    /** Parts of the higher column below which a block is too low to read. */
    private static final double READABLE = 0.016;

    static BalanceBlocks of(Balance balance) {
        double most = Math.max(balance.outWatts(), balance.gainWatts() + Math.max(0, floorWatts(balance)));
        double least = most * READABLE;
        List<HeatPath> losses = matching(balance.paths(), path -> path.watts() >= 0);
        List<HeatPath> gains = matching(balance.paths(), path -> path.watts() < 0);
        List<HeatPath> small = new ArrayList<>();
        List<Block> out = blocks(losses, Block.Look.LOSS, least, small);
        List<Block> in = new ArrayList<>(supply(balance));
        in.addAll(blocks(gains, Block.Look.GAIN, least, small));
        String merged = small.stream()
                .map(path -> path.label() + " " + Figures.watts(path.watts()))
                .collect(Collectors.joining("; "));
        return new BalanceBlocks(out, List.copyOf(in), merged);
    }

    double highest() {
        return Math.max(watts(out), watts(in));
    }

    static double watts(List<Block> blocks) {
        return blocks.stream().mapToDouble(Block::watts).sum();
    }

    private static double floorWatts(Balance balance) {
        return balance.floor()
                .map(floor -> floor.givenWatts() + floor.supplementWatts())
                .orElse(balance.totalWatts());
    }

    private static List<HeatPath> matching(List<HeatPath> paths, Predicate<HeatPath> wanted) {
        return paths.stream().filter(wanted).toList();
    }

    private static List<Block> blocks(List<HeatPath> paths, Block.Look look, double least, List<HeatPath> small) {
        List<HeatPath> low = matching(paths, path -> Math.abs(path.watts()) < least);
        if (low.size() < 2) {
            return paths.stream().map(path -> block(path, look)).toList();
        }
        small.addAll(low);
        List<Block> blocks = new ArrayList<>();
        paths.stream().filter(path -> !low.contains(path)).forEach(path -> blocks.add(block(path, look)));
        blocks.add(block(merge(low, look), look));
        return blocks;
    }

    private static HeatPath merge(List<HeatPath> low, Block.Look look) {
        double watts = low.stream().mapToDouble(HeatPath::watts).sum();
        boolean shared = low.stream().allMatch(path -> path.share().isPresent());
        double share = low.stream().mapToDouble(path -> path.share().orElse(0)).sum();
        String kind = look == Block.Look.GAIN ? " smaller gains" : " smaller paths";
        return new HeatPath(low.size() + kind, watts, shared ? OptionalDouble.of(share) : OptionalDouble.empty());
    }

    private static Block block(HeatPath path, Block.Look look) {
        String share = path.share().isPresent() ? Figures.percent(path.share().getAsDouble()) : "";
        return new Block(Math.abs(path.watts()), look, path.label(), Figures.watts(path.watts()), share, "");
    }

    private static List<Block> supply(Balance balance) {
        if (balance.floor().isPresent()) {
            return supply(balance.floor().get());
        }
        double watts = balance.totalWatts();
        if (watts <= 0) {
            return List.of();
        }
        String words = "must come from something else";
        return List.of(new Block(watts, Block.Look.MISSING, "no heated floor:", Figures.watts(watts), "", words));
    }

    private static List<Block> supply(FloorHeat floor) {
        List<Block> blocks = new ArrayList<>();
        if (floor.supplementWatts() > 0) {
            String missing = "missing " + Figures.watts(floor.supplementWatts()) + ":";
            String words = "something else must add this";
            blocks.add(new Block(floor.supplementWatts(), Block.Look.MISSING, "", missing, "", words));
        }
        blocks.add(new Block(
                floor.givenWatts(),
                Block.Look.FLOOR,
                "heated floor",
                Figures.watts(floor.givenWatts()),
                "",
                remark(floor)));
        return blocks;
    }

    private static String remark(FloorHeat floor) {
        if (floor.requiredWatts() <= 0) {
            return "nothing is asked of it";
        }
        if (floor.carriedWatts() <= floor.requiredWatts()) {
            return "all it can carry";
        }
        return "can carry " + Figures.watts(floor.carriedWatts());
    }
}
