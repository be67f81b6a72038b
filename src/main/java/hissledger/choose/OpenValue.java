package hissledger.choose;

import hissledger.circuit.Passive;
import hissledger.circuit.PathElement;
import hissledger.circuit.SeriesElement;
import hissledger.circuit.ShuntElement;
import hissledger.circuit.Transformer;
import hissledger.physics.Require;

/** A value of a candidate that a search may choose within a range. The value that the candidate states is where it stands. */
public sealed interface OpenValue {
    /** Its name in results. */
    String name();

    /** Lower end of its range. */
    double from();

    /** Upper end of its range. */
    double to();

    /**
     * How many devices are in parallel, per side of a pair.
     *
     * @param least at least 1
     * @param greatest not below {@code least}
     */
    record Count(int least, int greatest) implements OpenValue {
        public Count {
            Require.atLeast("least", least, 1);
            Require.atLeast("greatest", greatest, least);
        }

        @Override
        public String name() {
            return "devices in parallel";
        }

        @Override
        public double from() {
            return least;
        }

        @Override
        public double to() {
            return greatest;
        }
    }

    /**
     * The turns ratio of a transformer. The window being the same, the resistance of the secondary and the leakage inductance go
     * with the square of the ratio from what is stated.
     *
     * @param element the transformer's name
     * @param from least secondary over primary turns, &gt; 0
     * @param to greatest
     */
    record Ratio(String element, double from, double to) implements OpenValue {
        public Ratio {
            Require.positive("from", from, "");
            Require.positive("to", to - from, "");
        }

        @Override
        public String name() {
            return "ratio of " + element;
        }

        PathElement set(PathElement part, double ratio) {
            Transformer stated = (Transformer) part;
            double turns = ratio / stated.ratio();
            return new Transformer(
                    stated.name(),
                    ratio,
                    stated.primaryOhms(),
                    stated.secondaryOhms() * turns * turns,
                    stated.primaryHenries(),
                    stated.leakageHenries() * turns * turns,
                    stated.coreLossOhms(),
                    stated.windingFarads(),
                    stated.temperatureKelvin());
        }
    }

    /**
     * A resistor of the path.
     *
     * @param element the resistor's name
     * @param from least resistance, Ω; &gt; 0
     * @param to greatest, Ω
     */
    record Resistance(String element, double from, double to) implements OpenValue {
        public Resistance {
            Require.positive("from", from, "Ω");
            Require.positive("to", to - from, "Ω");
        }

        @Override
        public String name() {
            return element;
        }

        PathElement set(PathElement part, double ohms) {
            if (part instanceof ShuntElement shunt && shunt.part() instanceof Passive.Resistor stated) {
                return new ShuntElement(
                        shunt.name(), of(stated, ohms), shunt.legs(), shunt.temperatureKelvin(), shunt.supply());
            }
            if (part instanceof SeriesElement series && series.part() instanceof Passive.Resistor stated) {
                return new SeriesElement(series.name(), of(stated, ohms), series.legs(), series.temperatureKelvin());
            }
            throw new IllegalArgumentException(element + " is no resistor");
        }

        private static Passive.Resistor of(Passive.Resistor stated, double ohms) {
            return new Passive.Resistor(ohms, stated.noiseIndex(), stated.directVolts());
        }
    }
}
