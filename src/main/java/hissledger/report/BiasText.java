package hissledger.report;

import hissledger.choose.BiasDesign;
import hissledger.choose.BiasNetwork;
import hissledger.choose.OperatingPoint;
import hissledger.device.DeviceKind;
import hissledger.device.Polarity;
import hissledger.files.Phrases;
import hissledger.physics.Decibels;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** A bias design as text, as a tree for JSON and as CSV. */
public final class BiasText {
    private static final String END = "\r\n";
    private static final String OHM = "Ω";

    private BiasText() {}

    /** A part of the network. */
    private record Part(String name, double value, String unit, String why) {}

    /** The whole text, lines ended by line feeds. */
    public static String of(BiasDesign.Outcome outcome) {
        StringBuilder text = new StringBuilder();
        text.append(outcome.scenario().title()).append('\n');
        Words.conditions(outcome.scenario()).forEach(line -> text.append(line).append('\n'));
        int count = outcome.stated().plan().inParallel();
        text.append('\n');
        line(
                text,
                String.format(
                        Locale.ROOT,
                        "[%s] %s%s, %s, wanted %s each, from %s; resistors %s, %s %% each, headroom at least %s peak.",
                        outcome.stated().name(),
                        outcome.stated().device().id(),
                        count == 1 ? "" : " x" + count,
                        outcome.stated().plan().arrangement().label(),
                        Words.value(outcome.wantedAmps(), "A"),
                        Phrases.brief(outcome.request().supplyVolts(), "V"),
                        outcome.request().series(),
                        percent(outcome.request().tolerance()),
                        Phrases.brief(outcome.request().headroomVolts(), "V")));
        text.append('\n');
        TextTable parts = new TextTable()
                .column(TextTable.Align.LEFT, "part")
                .column(TextTable.Align.POINT, "value")
                .column(TextTable.Align.LEFT, "");
        parts(outcome).forEach(part -> parts.row(part.name(), Phrases.brief(part.value(), part.unit()), part.why()));
        text.append(parts.render()).append('\n');
        boolean bipolar = isBipolar(outcome);
        TextTable cases = new TextTable()
                .column(TextTable.Align.LEFT, "case")
                .column(TextTable.Align.POINT, bipolar ? "IC" : "ID", "of each")
                .column(TextTable.Align.POINT, bipolar ? "VCE" : "VDS")
                .column(TextTable.Align.POINT, "headroom", "peak")
                .column(TextTable.Align.POINT, "supply", "current");
        for (BiasDesign.Case each : outcome.cases()) {
            OperatingPoint point = each.point();
            cases.row(
                    each.words(),
                    Words.value(point.amps(), "A"),
                    Words.value(point.deviceVolts(), "V"),
                    Words.value(point.swingVolts(), "V"),
                    Words.value(point.supplyAmps(), "A"));
        }
        text.append(cases.render()).append('\n');
        line(
                text,
                "Spread of the current: from " + change(outcome.leastAmps(), outcome) + " to "
                        + change(outcome.greatestAmps(), outcome) + " % of the typical one, everything together.");
        line(
                text,
                "EIN " + Words.value(outcome.einVolts(), "V") + " rms, " + Words.dbu(outcome.einVolts())
                        + " dBu; with noiseless bias " + Words.dbu(outcome.idealVolts())
                        + " dBu: the bias network costs " + Words.decibels(outcome.costDecibels()) + " dB.");
        line(
                text,
                outcome.tried() + " networks kept the headroom, " + outcome.nearBest()
                        + " of them within 0.1 dB of the quietest; of these the steadiest, then the one with the fewest"
                        + " different values.");
        assumptions(outcome).forEach(sentence -> line(text, sentence));
        return text.toString();
    }

    private static boolean isBipolar(BiasDesign.Outcome outcome) {
        return outcome.stated().device().kind() == DeviceKind.BIPOLAR;
    }

    private static List<String> assumptions(BiasDesign.Outcome outcome) {
        List<String> list = new ArrayList<>();
        Polarity polarity = outcome.stated().device().polarity();
        if (polarity == Polarity.PNP || polarity == Polarity.P_CHANNEL) {
            list.add("Voltages are magnitudes, and the parts are named for a supply of the device's polarity ("
                    + polarity.label()
                    + ": negative). From a positive supply exchange supply and ground in the names of all parts.");
        }
        list.add("Worst cases: 0 °C to 50 °C, tolerances and the device's bounds together.");
        if (isBipolar(outcome)) {
            list.add("Assumed (common practice, no source): VBE 0.65 V at 1 mA and 25 °C, -2 mV/K; saturation at VCE ="
                    + " 0.5 V. hFE is taken as the same at all temperatures.");
            if (outcome.capacitors().stream().noneMatch(each -> each.name().equals("coupling"))) {
                list.add("The coupling capacitor of the shared path is left as the scenario states it.");
            }
        } else {
            list.add("Assumed: square law; IDSS and VGS(off) at their least, typical and greatest together; saturation"
                    + " at VDS = |VGS(off)|. Gate leakage and the change of IDSS with temperature are left out, so the"
                    + " current does not move with temperature here.");
        }
        list.add("Excess noise: resistors with direct voltage counted with a noise index of -20 dB re 1 µV/V.");
        if (outcome.stated().plan().around().cascode()) {
            list.add("The voltage that the cascode takes is left out: add it to the supply.");
        }
        return list;
    }

    private static String change(double amps, BiasDesign.Outcome outcome) {
        return String.format(
                Locale.ROOT, "%.0f", 100.0 * amps / outcome.typical().amps());
    }

    private static String percent(double part) {
        return Phrases.brief(100.0 * part, "");
    }

    private static List<Part> parts(BiasDesign.Outcome outcome) {
        BiasNetwork network = outcome.network();
        boolean bipolar = isBipolar(outcome);
        List<Part> parts = new ArrayList<>();
        if (network.hasDivider()) {
            parts.add(new Part("supply to base", network.upperOhms(), OHM, ""));
            parts.add(new Part(
                    "base to ground",
                    network.lowerOhms(),
                    OHM,
                    "together " + Phrases.value(network.parallelOhms(), OHM) + " at the base"));
        } else {
            parts.add(new Part("gate to ground", network.lowerOhms(), OHM, ""));
        }
        String lead = bipolar ? "emitter to ground" : "source to ground";
        if (network.unbypassedOhms() > 0.0) {
            parts.add(new Part(lead + " unbypassed", network.unbypassedOhms(), OHM, "as stated"));
        }
        parts.add(new Part(
                lead, network.leadOhms(), OHM, Phrases.value(outcome.typical().leadVolts(), "V") + " across"));
        if (network.loadOhms() > 0.0) {
            parts.add(new Part(
                    bipolar ? "supply to collector" : "supply to drain",
                    network.loadOhms(),
                    OHM,
                    Phrases.value(outcome.typical().loadVolts(), "V") + " across"));
        }
        for (BiasDesign.Capacitor capacitor : outcome.capacitors()) {
            parts.add(new Part(
                    capacitor.name() + " capacitor", capacitor.farads(), "F", capacitor.reason() + " asks for more"));
        }
        return parts;
    }

    /** The design as a tree of maps, lists and numbers. */
    public static Map<String, Object> tree(BiasDesign.Outcome outcome) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("title", outcome.scenario().title());
        tree.put("candidate", outcome.stated().name());
        tree.put("device", outcome.stated().device().id());
        tree.put("wantedCurrent_A", outcome.wantedAmps());
        tree.put("supply_V", outcome.request().supplyVolts());
        tree.put("series", outcome.request().series().toString());
        tree.put("tolerance", outcome.request().tolerance());
        List<Object> parts = new ArrayList<>();
        for (Part part : parts(outcome)) {
            Map<String, Object> each = new LinkedHashMap<>();
            each.put("part", part.name());
            each.put(part.unit().equals(OHM) ? "value_ohm" : "value_F", part.value());
            parts.add(each);
        }
        tree.put("parts", parts);
        List<Object> cases = new ArrayList<>();
        for (BiasDesign.Case each : outcome.cases()) {
            Map<String, Object> point = new LinkedHashMap<>();
            point.put("case", each.words());
            point.put("current_A", each.point().amps());
            point.put("deviceVoltage_V", each.point().deviceVolts());
            point.put("headroom_V", each.point().swingVolts());
            point.put("supplyCurrent_A", each.point().supplyAmps());
            cases.add(point);
        }
        tree.put("cases", cases);
        tree.put("einFlat_V", outcome.einVolts());
        tree.put("einFlat_dBu", Decibels.dbu(outcome.einVolts()));
        tree.put("einFlatNoiselessBias_dBu", Decibels.dbu(outcome.idealVolts()));
        tree.put("biasCost_dB", outcome.costDecibels());
        tree.put("assumptions", assumptions(outcome));
        return tree;
    }

    /** One row a part. */
    public static String csv(BiasDesign.Outcome outcome) {
        StringBuilder text = new StringBuilder("part,value,unit").append(END);
        for (Part part : parts(outcome)) {
            text.append(part.name())
                    .append(',')
                    .append(part.value())
                    .append(',')
                    .append(part.unit().equals(OHM) ? "ohm" : part.unit())
                    .append(END);
        }
        return text.toString();
    }

    private static void line(StringBuilder text, String sentence) {
        Words.wrapped(sentence).forEach(line -> text.append(line).append('\n'));
    }
}
