package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;

import hissledger.choose.Comparison;
import hissledger.choose.ResistanceSweep;
import hissledger.choose.Scenario;
import hissledger.files.Catalogue;
import hissledger.files.InputException;
import hissledger.files.ScenarioReader;
import hissledger.ledger.Figure;
import hissledger.physics.Weighting;
import java.awt.BasicStroke;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import javax.imageio.ImageIO;
import org.jfree.chart.plot.Marker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.ui.Layer;
import org.junit.jupiter.api.Test;

class ComparisonChartTest {
    private static Comparison comparison(String scenario) throws InputException {
        Scenario read = ScenarioReader.read(Path.of("scenarios", scenario), Catalogue.load(List.of()));
        return Comparison.of(read, Figure.EIN_FLAT);
    }

    private static XYPlot plot(Picture picture) {
        return picture.chart().getXYPlot();
    }

    @Test
    void theDensityChartShowsEveryCandidateAndTheFloorInsideItsAxes() throws InputException {
        Comparison comparison = comparison("vocal-dynamic.json");
        XYPlot plot = plot(ComparisonChart.density(comparison));
        assertThat(plot.getSeriesCount()).isEqualTo(comparison.ranked().size() + 1);
        assertThat(String.valueOf(plot.getDataset().getSeriesKey(plot.getSeriesCount() - 1)))
                .isEqualTo("floor: the source alone");
        assertThat(plot.getDomainAxis().getRange().getLowerBound()).isEqualTo(20.0);
        assertThat(plot.getDomainAxis().getRange().getUpperBound()).isEqualTo(20_000.0);
        assertThat(plot.getDomainAxis().getLabel()).isEqualTo("frequency, Hz");
        assertThat(plot.getRangeAxis().getLabel()).isEqualTo("equivalent input noise density, nV/√Hz");
        for (int series = 0; series < plot.getSeriesCount(); series++) {
            for (int item = 0; item < plot.getDataset().getItemCount(series); item++) {
                assertThat(plot.getRangeAxis()
                                .getRange()
                                .contains(plot.getDataset().getYValue(series, item)))
                        .isTrue();
            }
        }
    }

    @Test
    void theConditionsStandUnderTheTitle() throws InputException {
        List<String> lines = new ArrayList<>();
        for (Object title : ComparisonChart.density(comparison("vocal-dynamic.json"))
                .chart()
                .getSubtitles()) {
            if (title instanceof TextTitle text) {
                lines.add(text.getText());
            }
        }
        assertThat(lines)
                .containsExactly(
                        "Low-output moving-coil vocal microphone, battery recorder",
                        "Source: coil 200 Ω + 600 µH, at 20 °C. Path and stage at 27 °C.",
                        "Density 20 Hz to 20 kHz, unweighted, at the source's EMF, source noise included.");
    }

    @Test
    void seriesDifferWithoutColour() throws InputException {
        XYPlot plot = plot(ComparisonChart.density(comparison("vocal-dynamic.json")));
        XYLineAndShapeRenderer renderer = (XYLineAndShapeRenderer) plot.getRenderer();
        Set<String> dashes = new HashSet<>();
        Set<Object> markers = new HashSet<>();
        int candidates = plot.getSeriesCount() - 1;
        for (int series = 0; series < candidates; series++) {
            dashes.add(Arrays.toString(((BasicStroke) renderer.getSeriesStroke(series)).getDashArray()));
            markers.add(renderer.getSeriesShape(series).getBounds2D() + " "
                    + renderer.getSeriesShape(series).getClass());
        }
        assertThat(dashes).hasSize(candidates);
        assertThat(markers).hasSize(candidates);
    }

    @Test
    void aSourceWithoutNoiseOfItsOwnHasNoFloorLine() throws InputException {
        Scenario read = ScenarioReader.read(Path.of("scenarios", "capsule.json"), Catalogue.load(List.of()));
        hissledger.circuit.CapacitorSource lossy = (hissledger.circuit.CapacitorSource) read.source();
        Scenario lossless = read.withSource(new hissledger.circuit.CapacitorSource(
                lossy.capacitanceFarads(), 0.0, lossy.parallelOhms(), lossy.temperatureKelvin(), lossy.signal()));
        XYPlot plot = plot(ComparisonChart.density(Comparison.of(lossless, Figure.EIN_A)));
        assertThat(plot.getSeriesCount()).isEqualTo(lossless.candidates().size());
    }

    @Test
    void theResistanceChartMarksLimitSourceAndCrossing() throws InputException {
        Comparison comparison = comparison("vocal-dynamic.json");
        List<Double> ohms = ResistanceSweep.grid(2);
        List<ResistanceSweep> sweeps = comparison.ranked().stream()
                .map(each -> ResistanceSweep.of(comparison.scenario(), each, ohms, Weighting.FLAT))
                .toList();
        List<Double> floor =
                ResistanceSweep.floorVolts(comparison.scenario(), comparison.winner(), ohms, Weighting.FLAT);
        XYPlot plot = plot(ComparisonChart.resistance(comparison, sweeps, floor));
        assertThat(labels(plot.getRangeMarkers(Layer.FOREGROUND))).containsExactly("limit -127.5 dBu");
        assertThat(labels(plot.getDomainMarkers(Layer.FOREGROUND)))
                .hasSize(2)
                .contains("this source, 200 Ω")
                .anySatisfy(label -> assertThat(label).startsWith("bipolar and JFET change places, "));
        assertThat(plot.getDomainAxis().getLabel()).isEqualTo("source resistance, Ω");
        assertThat(plot.getRangeAxis().getLabel()).isEqualTo("equivalent input noise over the band, unweighted, dBu");
    }

    private static List<String> labels(java.util.Collection<?> markers) {
        return markers.stream().map(marker -> ((Marker) marker).getLabel()).toList();
    }

    @Test
    void thePngHasTheAskedSizeAndTheSameBytesTwice() throws InputException, IOException {
        Picture picture = ComparisonChart.density(comparison("cartridge-mm.json"));
        for (int[] size : new int[][] {{1600, 1000}, {800, 500}}) {
            byte[] png = picture.png(size[0], size[1]);
            BufferedImage image = ImageIO.read(new ByteArrayInputStream(png));
            assertThat(image.getWidth()).isEqualTo(size[0]);
            assertThat(image.getHeight()).isEqualTo(size[1]);
            assertThat(picture.png(size[0], size[1])).isEqualTo(png);
        }
    }

    /** Whatever is drawn stays off the outermost pixels: nothing is cut at the frame. */
    @Test
    void nothingTouchesTheFrame() throws InputException, IOException {
        Picture picture = ComparisonChart.density(comparison("vocal-dynamic.json"));
        BufferedImage image = ImageIO.read(new ByteArrayInputStream(picture.png(1600, 1000)));
        int white = 0xFFFFFF;
        for (int x = 0; x < image.getWidth(); x++) {
            assertThat(image.getRGB(x, 2) & white).isEqualTo(white);
            assertThat(image.getRGB(x, image.getHeight() - 3) & white).isEqualTo(white);
        }
        for (int y = 0; y < image.getHeight(); y++) {
            assertThat(image.getRGB(2, y) & white).isEqualTo(white);
            assertThat(image.getRGB(image.getWidth() - 3, y) & white).isEqualTo(white);
        }
    }

    @Test
    void labelsDoNotDependOnTheLocale() throws InputException {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.ROOT);
            byte[] plain =
                    ComparisonChart.density(comparison("ribbon-secondary.json")).png(800, 500);
            Locale.setDefault(Locale.GERMANY);
            assertThat(ComparisonChart.density(comparison("ribbon-secondary.json"))
                            .png(800, 500))
                    .isEqualTo(plain);
        } finally {
            Locale.setDefault(before);
        }
    }
}
