package hissledger.chart;

import java.util.List;

/**
 * What one chart shows, before any size is chosen.
 *
 * @param title its title
 * @param conditions the sentences under the title: what the figures refer to
 * @param across the horizontal axis
 * @param up the vertical axis
 * @param traces its lines, the foremost first
 * @param places marked places on the horizontal axis
 * @param shades areas between two lines, behind everything
 * @param regions areas that belong to candidates, hatched and named
 * @param isolines lines of equal value
 */
record Plate(
        String title,
        List<String> conditions,
        Scale across,
        Scale up,
        List<Trace> traces,
        List<Place> places,
        List<Shade> shades,
        List<Region> regions,
        List<Isoline> isolines) {
    Plate {
        conditions = List.copyOf(conditions);
        traces = List.copyOf(traces);
        places = List.copyOf(places);
        shades = List.copyOf(shades);
        regions = List.copyOf(regions);
        isolines = List.copyOf(isolines);
    }

    /** A plate without shaded areas. */
    Plate(String title, List<String> conditions, Scale across, Scale up, List<Trace> traces, List<Place> places) {
        this(title, conditions, across, up, traces, places, List.of());
    }

    /** A plate of lines and shaded areas. */
    Plate(
            String title,
            List<String> conditions,
            Scale across,
            Scale up,
            List<Trace> traces,
            List<Place> places,
            List<Shade> shades) {
        this(title, conditions, across, up, traces, places, shades, List.of(), List.of());
    }
}
