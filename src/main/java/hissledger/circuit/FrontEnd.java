package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.twoport.ChainPass;
import java.util.List;

/**
 * A source, the path behind it and an active stage.
 *
 * @param source the transducer
 * @param path passive elements from the source toward the stage
 * @param stage the active stage
 */
public record FrontEnd(Source source, List<PathElement> path, Stage stage) {
    /** The source's own thermal noise. */
    public static final NoiseSource SOURCE_NOISE = NoiseSource.of(NoiseKind.SOURCE);

    public FrontEnd {
        path = List.copyOf(path);
    }

    /** This front end behind another source. */
    public FrontEnd withSource(Source other) {
        return new FrontEnd(other, path, stage);
    }

    /** Walks from the source to the end; contributions are EMF densities, V²/Hz, the source's own the first of them. */
    public void walk(ChainPass pass) {
        pass.beginBehind(source.impedance());
        pass.sourceNoise(SOURCE_NOISE, source.temperatureKelvin());
        walkBehindSource(pass);
    }

    /** Continues a walk that the caller began at the port behind the source: path and stage. */
    public void walkBehindSource(ChainPass pass) {
        walkPath(pass);
        stage.walk(pass);
    }

    /**
     * Continues such a walk as far as the response and the loading of the source go: path and stage, or the path alone where
     * feedback around the stage lifts its input impedance out of sight and fixes its gain.
     */
    public void walkLoading(ChainPass pass) {
        walkPath(pass);
        if (stage.loadsSource()) {
            stage.walk(pass);
        }
    }

    private void walkPath(ChainPass pass) {
        for (PathElement element : path) {
            element.walkSupply(pass, path);
            element.walk(pass);
        }
    }
}
