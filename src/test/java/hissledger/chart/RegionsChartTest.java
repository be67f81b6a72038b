package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;

import hissledger.choose.Candidate;
import hissledger.choose.NoiseFigureMap;
import hissledger.choose.Regions;
import hissledger.choose.Scenario;
import hissledger.files.Catalogue;
import hissledger.files.InputException;
import hissledger.files.ScenarioReader;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RegionsChartTest {
    private static final int POINTS = 60;
    private static final int THREADS = 2;
    private static final double LEAST_LETTERS = 9.0;
    private static final int HATCHINGS = 10;

    private static Scenario scenario(String name) throws InputException {
        return ScenarioReader.read(Path.of("scenarios", name + ".json"), Catalogue.load(List.of()));
    }

    private static Regions regions(String name) throws InputException {
        return Regions.of(scenario(name), 1.0, 10e6, POINTS, THREADS);
    }

    private static NoiseFigureMap map(String name, int candidate) throws InputException {
        Scenario scenario = scenario(name);
        Candidate chosen = scenario.candidates().get(candidate);
        return NoiseFigureMap.of(scenario, chosen, 1.0, 10e6, POINTS, POINTS, THREADS);
    }

    @ParameterizedTest
    @CsvSource({"1600, 1000", "800, 500"})
    void letteringIsWholeAndApart(int width, int height) throws InputException {
        List<Picture> pictures = new ArrayList<>();
        for (String name :
                List.of("vocal-dynamic", "geophone", "cartridge-mm", "ribbon-bare", "capsule", "guitar-pickup")) {
            pictures.add(RegionsChart.winners(regions(name)));
            pictures.add(RegionsChart.contours(map(name, 0)));
        }
        Rectangle2D page = new Rectangle2D.Double(0.0, 0.0, width, height);
        for (Picture picture : pictures) {
            List<RecordingGraphics.Written> written = RecordingGraphics.written(picture, width, height);
            assertThat(written).hasSizeGreaterThan(12);
            for (int k = 0; k < written.size(); k++) {
                RecordingGraphics.Written one = written.get(k);
                assertThat(page.contains(one.ink())).as("on the page: %s", one).isTrue();
                assertThat(one.isCut()).as("cut off: %s", one).isFalse();
                assertThat(one.text()).doesNotContain("…");
                assertThat(one.size()).as("legible: %s", one).isGreaterThan(LEAST_LETTERS);
                for (RecordingGraphics.Written other : written.subList(k + 1, written.size())) {
                    assertThat(one.ink().intersects(other.ink()))
                            .as("%s over %s", one, other)
                            .isFalse();
                }
            }
        }
    }

    @Test
    void everyWinnerIsNamedInItsRegionAndBesideTheField() throws InputException {
        Regions regions = regions("vocal-dynamic");
        List<String> texts = RecordingGraphics.written(RegionsChart.winners(regions), 1600, 1000).stream()
                .map(RecordingGraphics.Written::text)
                .toList();
        List<String> winners = regions.winners().stream().map(regions::name).toList();
        assertThat(winners).hasSizeGreaterThan(2);
        for (String name : winners) {
            assertThat(texts.stream().filter(name::equals)).as(name).hasSizeGreaterThanOrEqualTo(2);
        }
        assertThat(texts).contains("source 200 Ω", "1 dB", "frequency, Hz", "source resistance, Ω");
        assertThat(String.join(" ", texts))
                .contains("change places at", "Nowhere quietest: \"PNP switch\", \"high-gain NPN\".");
    }

    @Test
    void theMapHasItsContoursRidgeAndWorkingPoint() throws InputException {
        NoiseFigureMap map = map("vocal-dynamic", 0);
        Plate plate = RegionsChart.contoursPlate(map);
        assertThat(plate.isolines()).extracting(Isoline::level).containsExactly(0.5, 1.0, 2.0, 3.0, 6.0, 10.0);
        assertThat(plate.traces()).hasSize(1);
        assertThat(plate.traces().get(0).y()).isEqualTo(map.ridge());
        NoiseFigureMap.WorkingPoint point = map.working().orElseThrow();
        assertThat(plate.places()).hasSize(1);
        assertThat(plate.places().get(0).x()).isEqualTo(point.ohms());
        assertThat(plate.places().get(0).y()).hasValue(point.amps());
        List<String> texts = RecordingGraphics.written(RegionsChart.contours(map), 1600, 1000).stream()
                .map(RecordingGraphics.Written::text)
                .toList();
        assertThat(texts).contains("2 dB", "3 dB", "6 dB", "10 dB", "best current");
    }

    /** In grey, and even in black and white, no two hatchings are the same. */
    @Test
    void hatchingsDifferWithoutColour() {
        Set<String> seen = new HashSet<>();
        for (int number = 0; number < HATCHINGS; number++) {
            int size = 64;
            BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
            MapShade.hatch(image.createGraphics(), new Rectangle2D.Double(0.0, 0.0, size, size), number, 1.0);
            StringBuilder inked = new StringBuilder();
            int tint = 0x40;
            for (int x = 0; x < size; x++) {
                for (int y = 0; y < size; y++) {
                    inked.append((image.getRGB(x, y) >>> 24) > tint ? '#' : '.');
                }
            }
            assertThat(inked.toString()).contains("#", ".");
            seen.add(inked.toString());
        }
        assertThat(seen).hasSize(HATCHINGS);
    }

    @Test
    void theSameResultGivesTheSameBytes() throws InputException {
        assertThat(RegionsChart.winners(regions("geophone")).png(800, 500))
                .isEqualTo(RegionsChart.winners(regions("geophone")).png(800, 500));
    }
}
