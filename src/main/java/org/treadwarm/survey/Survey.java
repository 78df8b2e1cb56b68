package org.treadwarm.survey;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.units.Wording;

/** The whole document: site, assemblies, spaces and rooms; maps keep the order of the document. */
public record Survey(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,
        @Wording(label = "site") Site site,

        @Wording(label = "assemblies", help = "Build-ups of layers, and windows and doors of a known U-value.")
        Map<String, Assembly> assemblies,

        @Wording(label = "spaces", help = "What lies on the other side: unheated spaces and neighbours.")
        Map<String, Space> spaces,

        @Wording(label = "rooms") List<Room> rooms) {
    /** The other side that is the open air. */
    public static final String OUTDOORS = "outdoors";

    /** The other side that is the ground. */
    public static final String GROUND = "ground";
}
