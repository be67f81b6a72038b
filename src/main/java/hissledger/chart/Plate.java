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
 */
record Plate(
        String title,
        List<String> conditions,
        Scale across,
        Scale up,
        List<Trace> traces,
        List<Place> places,
        List<Shade> shades) {
    Plate {
        conditions = List.copyOf(conditions);
        traces = List.copyOf(traces);
        places = List.copyOf(places);
        shades = List.copyOf(shades);
    }

    /** A plate without shaded areas. */
    Plate(String title, List<String> conditions, Scale across, Scale up, List<Trace> traces, List<Place> places) {
        this(title, conditions, across, up, traces, places, List.of());
    }
}
