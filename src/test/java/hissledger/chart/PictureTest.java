package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;

import hissledger.choose.Comparison;
import hissledger.choose.Evaluation;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import javax.imageio.ImageIO;
import javax.imageio.ImageReader;
import javax.imageio.stream.ImageInputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.w3c.dom.Element;

/** What is seen of a picture: its pixels and its lettering. */
class PictureTest {
    /** A thin line of pure colour across the field leaves far more than this, smoothing apart. */
    private static final int FEWEST_PIXELS = 60;

    /** Letters smaller than this are not read on a screen, pixels. */
    private static final double LEAST_LETTERS = 9.0;

    private static final int TOO_MANY_TO_NAME = 40;

    @ParameterizedTest
    @CsvSource({"1600, 1000", "800, 500", "3840, 2160", "640, 400", "1000, 1400"})
    void letteringIsWholeAndApartAtEverySize(int width, int height) {
        for (Picture picture : pictures()) {
            List<RecordingGraphics.Written> written = RecordingGraphics.written(picture, width, height);
            Rectangle2D page = new Rectangle2D.Double(0.0, 0.0, width, height);
            assertThat(written).hasSizeGreaterThan(12);
            for (int k = 0; k < written.size(); k++) {
                RecordingGraphics.Written one = written.get(k);
                assertThat(page.contains(one.ink())).as("on the page: %s", one).isTrue();
                assertThat(one.isCut()).as("cut off: %s", one).isFalse();
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
    void namesEveryCandidateTheFloorAndTheTicks() {
        Comparison comparison = Comparisons.usual();
        List<String> density = texts(ComparisonChart.density(comparison));
        assertThat(density).contains("floor", "20", "50", "100", "1 k", "10 k", "20 k", "2", "5", "frequency, Hz");
        assertThat(density)
                .containsAll(comparison.ranked().stream().map(Evaluation::name).toList());
        List<String> resistance = texts(resistance(comparison));
        assertThat(resistance)
                .contains("1", "10", "100", "1 k", "10 k", "−120", "source 150 Ω", "limit")
                .containsAll(comparison.ranked().stream().map(Evaluation::name).toList());
    }

    @Test
    void tenLongNamesAreStillToldApart() {
        String all = String.join("\n", texts(ComparisonChart.density(Comparisons.crowded(10))));
        for (int k = 0; k < 10; k++) {
            assertThat(all).contains("candidate " + k + " with");
        }
        assertThat(all).contains("a-device-of-long-name-9", "1 mA each");
    }

    @Test
    void namesAsManyAsHaveRoomAndAlwaysTheFloor() {
        List<String> texts = texts(ComparisonChart.density(Comparisons.crowded(TOO_MANY_TO_NAME)), 640, 400);
        assertThat(texts).contains("floor");
        assertThat(texts).filteredOn(text -> text.startsWith("candidate ")).hasSizeBetween(5, TOO_MANY_TO_NAME - 1);
    }

    @Test
    void everyLineIsOnThePaper() throws IOException {
        Comparison comparison = Comparisons.usual();
        for (Picture picture : List.of(ComparisonChart.density(comparison), resistance(comparison))) {
            BufferedImage image = decoded(picture.png());
            for (int number = 0; number < comparison.ranked().size(); number++) {
                assertThat(pixels(
                                image, Look.colour(Trace.Role.CANDIDATE, number).getRGB()))
                        .as("colour of candidate %d", number)
                        .isGreaterThan(FEWEST_PIXELS);
            }
        }
    }

    @ParameterizedTest
    @CsvSource({"1600, 1000, 7874", "800, 500, 4724", "3840, 2160, 17008"})
    void statesItsSizeInPixelsAndInMetres(int width, int height, String pixelsPerMetre) throws IOException {
        byte[] bytes = ComparisonChart.density(Comparisons.usual()).png(width, height);
        BufferedImage image = decoded(bytes);
        assertThat(image.getWidth()).isEqualTo(width);
        assertThat(image.getHeight()).isEqualTo(height);
        ImageReader reader = ImageIO.getImageReadersByFormatName("png").next();
        try (ImageInputStream stream = ImageIO.createImageInputStream(new ByteArrayInputStream(bytes))) {
            reader.setInput(stream);
            Element root = (Element) reader.getImageMetadata(0).getAsTree("javax_imageio_png_1.0");
            Element size = (Element) root.getElementsByTagName("pHYs").item(0);
            assertThat(size.getAttribute("pixelsPerUnitXAxis")).isEqualTo(pixelsPerMetre);
            assertThat(size.getAttribute("pixelsPerUnitYAxis")).isEqualTo(pixelsPerMetre);
            assertThat(size.getAttribute("unitSpecifier")).isEqualTo("meter");
        } finally {
            reader.dispose();
        }
    }

    @Test
    void theSameResultGivesTheSameBytes() {
        assertThat(ComparisonChart.density(Comparisons.usual()).png())
                .isEqualTo(ComparisonChart.density(Comparisons.usual()).png());
        assertThat(resistance(Comparisons.usual()).png())
                .isEqualTo(resistance(Comparisons.usual()).png());
    }

    @Test
    void theLanguageOfTheMachineDoesNotMatter() {
        Locale before = Locale.getDefault();
        List<String> here = texts(resistance(Comparisons.usual()));
        List<String> density = texts(ComparisonChart.density(Comparisons.usual()));
        try {
            Locale.setDefault(Locale.GERMANY);
            assertThat(texts(resistance(Comparisons.usual()))).isEqualTo(here);
            assertThat(texts(ComparisonChart.density(Comparisons.usual()))).isEqualTo(density);
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void drawsWhereItIsTold() {
        BufferedImage image = new BufferedImage(1000, 700, BufferedImage.TYPE_INT_RGB);
        ComparisonChart.density(Comparisons.usual())
                .draw(image.createGraphics(), new Rectangle2D.Double(100.0, 150.0, 800.0, 500.0));
        int untouched = 0xFF000000;
        for (int x = 0; x < 1000; x++) {
            assertThat(image.getRGB(x, 149)).isEqualTo(untouched);
            assertThat(image.getRGB(x, 650)).isEqualTo(untouched);
        }
        for (int y = 0; y < 700; y++) {
            assertThat(image.getRGB(99, y)).isEqualTo(untouched);
            assertThat(image.getRGB(900, y)).isEqualTo(untouched);
        }
        assertThat(image.getRGB(105, 155)).isEqualTo(0xFFFFFFFF);
    }

    @Test
    void refusesSizesWithoutRoomForLettersOrInMemory() {
        Picture picture = ComparisonChart.density(Comparisons.usual());
        assertThat(catchThrowable(() -> picture.png(639, 400)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("width")
                .hasMessageContaining("640")
                .hasMessageContaining("639");
        assertThat(catchThrowable(() -> picture.png(640, 16_385)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("height must be at most 16384, was 16385");
    }

    private static List<Picture> pictures() {
        Comparison usual = Comparisons.usual();
        Comparison crowded = Comparisons.crowded(10);
        return List.of(
                ComparisonChart.density(usual),
                resistance(usual),
                ComparisonChart.density(crowded),
                resistance(crowded),
                ComparisonChart.density(Comparisons.crowded(TOO_MANY_TO_NAME)));
    }

    private static Picture resistance(Comparison comparison) {
        return ComparisonChart.resistance(comparison, Comparisons.sweeps(comparison), Comparisons.floor(comparison));
    }

    private static List<String> texts(Picture picture) {
        return texts(picture, Picture.USUAL_WIDTH, Picture.USUAL_HEIGHT);
    }

    private static List<String> texts(Picture picture, int width, int height) {
        return RecordingGraphics.written(picture, width, height).stream()
                .map(RecordingGraphics.Written::text)
                .collect(Collectors.toList());
    }

    private static BufferedImage decoded(byte[] png) throws IOException {
        return ImageIO.read(new ByteArrayInputStream(png));
    }

    private static int pixels(BufferedImage image, int rgb) {
        int count = 0;
        for (int y = 0; y < image.getHeight(); y++) {
            for (int x = 0; x < image.getWidth(); x++) {
                count += image.getRGB(x, y) == rgb ? 1 : 0;
            }
        }
        return count;
    }
}
