package hissledger.files;

import hissledger.circuit.CapacitorSource;
import hissledger.circuit.CoilSource;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Signal;
import hissledger.circuit.Source;
import hissledger.circuit.TableSource;
import hissledger.files.ScenarioShapes.SourceKeys;
import hissledger.physics.Band;
import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** The source out of what was read of it. */
final class SourceReader {
    private static final double NO_PART = Double.POSITIVE_INFINITY;
    private static final String SOUND_PRESSURE = "dB SPL";
    private static final String AIR = "air";

    private SourceReader() {}

    /** Names what does not go together, and reads the table where there is one. */
    static Optional<ImpedanceTable> check(
            Fields source, Path folder, Optional<Band> band, Faults faults, Set<Fault> others) {
        source.located(SourceKeys.REFERENCE_LEVEL).ifPresent(level -> checkLevel(source, level, faults));
        Optional<Located<String>> file = source.located(SourceKeys.FILE);
        if (file.isEmpty()) {
            return Optional.empty();
        }
        List<Fault> found = new ArrayList<>();
        Path path = folder.resolve(file.get().value());
        Optional<ImpedanceTable> table = ImpedanceTable.read(path, found);
        for (Fault fault : found) {
            if (fault.line() == 0) {
                faults.at(file.get().node(), "names " + path + ", which " + fault.message());
            } else {
                others.add(fault);
            }
        }
        if (table.isPresent() && band.isPresent()) {
            List<Double> hertz = table.get().hertz();
            double first = hertz.get(0);
            double last = hertz.get(hertz.size() - 1);
            if (band.get().fromHertz() < first || band.get().toHertz() > last) {
                faults.at(
                        file.get().node(),
                        "covers " + Quantities.brief(first, "Hz", 4) + " to " + Quantities.brief(last, "Hz", 4)
                                + ", less than the band "
                                + Quantities.brief(band.get().fromHertz(), "Hz", 4) + " to "
                                + Quantities.brief(band.get().toHertz(), "Hz", 4)
                                + "; measure further or narrow the band: a table is never continued");
            }
        }
        return table;
    }

    private static void checkLevel(Fields source, Located<Quantities.Parsed> level, Faults faults) {
        String unit = level.value().unit();
        if (unit.equals("V") || unit.equals("dBu") || unit.equals("dBV")) {
            return;
        }
        String stimulus = unit.equals(SOUND_PRESSURE) ? Signal.PASCAL : unit;
        Optional<Quantities.Parsed> sensitivity = source.get(SourceKeys.SENSITIVITY);
        if (sensitivity.isEmpty() || !stimulusUnit(sensitivity.get()).equals(stimulus)) {
            faults.at(
                    level.node(),
                    "in " + unit + " needs a sensitivity in V/" + stimulus + "; add it, or state the EMF in V");
        }
    }

    /** The unit behind the solidus of a sensitivity: {@code V/(m/s)} is per {@code m/s}. */
    private static String stimulusUnit(Quantities.Parsed sensitivity) {
        String unit = sensitivity.unit().substring("V/".length());
        String bare = unit.startsWith("(") ? unit.substring(1, unit.length() - 1) : unit;
        return bare.equals("m/s2") ? "m/s²" : bare;
    }

    /** The source. */
    static Source source(Fields source, Optional<ImpedanceTable> table, double usualKelvin) {
        double kelvin = source.get(ScenarioShapes.TEMPERATURE, usualKelvin);
        Signal signal = signal(source);
        String kind = source.need(ScenarioShapes.KIND);
        return switch (kind) {
            case "resistor" -> new ResistorSource(source.need(SourceKeys.RESISTANCE), kelvin, signal);
            case "coil" ->
                new CoilSource(
                        source.need(SourceKeys.RESISTANCE),
                        source.need(SourceKeys.INDUCTANCE),
                        source.get(SourceKeys.PARALLEL_RESISTANCE, NO_PART),
                        source.get(SourceKeys.PARALLEL_CAPACITANCE, 0.0),
                        kelvin,
                        signal);
            case "capacitor" ->
                new CapacitorSource(
                        source.need(SourceKeys.CAPACITANCE),
                        source.get(ScenarioShapes.LOSS_TANGENT, 0.0),
                        source.get(SourceKeys.PARALLEL_RESISTANCE, NO_PART),
                        kelvin,
                        signal);
            case "table" -> {
                ImpedanceTable values = table.orElseThrow();
                yield new TableSource(values.hertz(), values.resistanceOhms(), values.reactanceOhms(), kelvin, signal);
            }
            default -> throw new IllegalStateException("no source for " + kind);
        };
    }

    private static Signal signal(Fields source) {
        Optional<Quantities.Parsed> sensitivity = source.get(SourceKeys.SENSITIVITY);
        OptionalDouble voltsPerUnit =
                sensitivity.isPresent() ? OptionalDouble.of(sensitivity.get().value()) : OptionalDouble.empty();
        Optional<Quantities.Parsed> level = source.get(SourceKeys.REFERENCE_LEVEL);
        OptionalDouble reference = level.isPresent()
                ? OptionalDouble.of(referenceVolts(level.get(), voltsPerUnit.orElse(1.0)))
                : OptionalDouble.empty();
        String medium = source.get(SourceKeys.MEDIUM, AIR).equals(AIR) ? "" : " in water";
        String unit = sensitivity.map(each -> stimulusUnit(each) + medium).orElse("");
        return new Signal(voltsPerUnit, unit, reference);
    }

    private static double referenceVolts(Quantities.Parsed level, double voltsPerUnit) {
        return switch (level.unit()) {
            case "V" -> level.value();
            case "dBu" -> Decibels.dbuToVolts(level.value());
            case "dBV" -> Decibels.toAmplitudeRatio(level.value());
            case SOUND_PRESSURE ->
                voltsPerUnit * Constants.REFERENCE_SOUND_PRESSURE_PASCALS * Decibels.toAmplitudeRatio(level.value());
            default -> voltsPerUnit * level.value();
        };
    }
}
