package hissledger.files;

import hissledger.choose.Candidate;
import hissledger.choose.CurrentChoice;
import hissledger.choose.Design;
import hissledger.circuit.Arrangement;
import hissledger.circuit.CommonLead;
import hissledger.circuit.NextStage;
import hissledger.circuit.PairParts;
import hissledger.circuit.Passive;
import hissledger.circuit.StagePlan;
import hissledger.circuit.Surroundings;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.IncompleteDeviceException;
import hissledger.device.Parameter;
import hissledger.files.ScenarioShapes.CandidateKeys;
import hissledger.ledger.Figure;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** One candidate: what its keys say together, and the candidate itself. */
final class CandidateReader {
    private static final String OPTIMUM = "optimum";
    private static final int DIGITS = 4;

    private final Fields fields;
    private final Faults faults;
    private final Set<Fault> elsewhere;
    private final Catalogue catalogue;
    private Optional<Device> device = Optional.empty();
    private Optional<CurrentChoice> current = Optional.empty();

    /** A limit written in decimal is met although its binary form is not. */
    private static final double ROUNDING = 1e-12;

    private final Figure deciding;

    CandidateReader(Fields fields, Faults faults, Set<Fault> elsewhere, Catalogue catalogue, Figure deciding) {
        this.deciding = deciding;
        this.fields = fields;
        this.faults = faults;
        this.elsewhere = elsewhere;
        this.catalogue = catalogue;
    }

    /** Names what does not go together. */
    void check(Set<String> names, List<Located<Fields>> sharedPath) {
        fields.located(CandidateKeys.NAME).ifPresent(name -> {
            if (!names.add(name.value())) {
                faults.at(
                        name.node(),
                        "is the name of two candidates: " + name.node().quoted() + "; give each its own");
            }
        });
        fields.located(CandidateKeys.DEVICE).ifPresent(this::checkDevice);
        fields.get(CandidateKeys.PATH).ifPresent(path -> PathReader.check(path, faults));
        fields.get(CandidateKeys.LOAD).ifPresent(load -> PathReader.excess(load, faults));
        fields.get(CandidateKeys.COMMON_LEAD).ifPresent(this::checkLead);
        fields.located(CandidateKeys.CURRENT).ifPresent(stated -> current = currentChoice(stated.value()));
        fields.located(CandidateKeys.ARRANGEMENT).ifPresent(this::checkArrangement);
        checkCurrent();
        fields.get(CandidateKeys.OPEN)
                .ifPresent(open -> new OpenReader(faults)
                        .check(open, sharedPath, fields.get(CandidateKeys.PATH).orElse(List.of())));
    }

    private void checkDevice(Located<String> id) {
        try {
            device = catalogue.find(id.value());
        } catch (InputException broken) {
            elsewhere.addAll(broken.faults());
            return;
        }
        if (device.isEmpty()) {
            List<String> near = catalogue.nearest(id.value());
            faults.at(
                    id.node(),
                    "names no device of the catalogue, " + id.node().quoted()
                            + (near.isEmpty()
                                    ? "; see devices list, or add a folder with --devices"
                                    : "; did you mean " + String.join(" or ", near) + "?"));
            return;
        }
        try {
            resolve(device.get());
        } catch (IncompleteDeviceException incomplete) {
            faults.at(id.node(), "cannot be computed: " + incomplete.getMessage());
        }
    }

    private static void resolve(Device device) {
        switch (device.kind()) {
            case BIPOLAR -> device.bipolar();
            case JFET -> device.jfet();
            case AMPLIFIER -> device.amplifier();
        }
    }

    private void checkLead(Fields lead) {
        lead.located(CandidateKeys.BYPASS).ifPresent(bypass -> {
            if (lead.get(CandidateKeys.LEAD_RESISTOR, 0.0) == 0.0) {
                faults.at(bypass.node(), "has no resistor to bypass; add commonLead.resistor or remove it");
            }
        });
        lead.located(CandidateKeys.BYPASS_ESR).ifPresent(esr -> {
            if (lead.get(CandidateKeys.BYPASS).isEmpty()) {
                faults.at(esr.node(), "belongs to a bypass capacitor; add commonLead.bypass or remove it");
            }
        });
    }

    private void checkArrangement(Located<Arrangement> stated) {
        Arrangement arrangement = stated.value();
        device.ifPresent(known -> {
            if (!arrangement.fits(known.kind())) {
                List<String> fitting = List.of(Arrangement.values()).stream()
                        .filter(other -> other.fits(known.kind()))
                        .map(Arrangement::label)
                        .toList();
                faults.at(
                        stated.node(),
                        "does not fit " + known.id() + ", a device of kind "
                                + known.kind().label() + "; use one of " + String.join(", ", fitting));
            }
        });
        boolean gain = arrangement == Arrangement.GAIN_RESISTOR_PAIR;
        boolean other = arrangement == Arrangement.SINGLE_ENDED_PAIR;
        boolean transistor = arrangement != Arrangement.AMPLIFIER;
        belongs(CandidateKeys.GAIN_RESISTOR, gain, gain, stated);
        belongs(CandidateKeys.FEEDBACK_RESISTOR, gain, gain, stated);
        belongs(CandidateKeys.OTHER_SIDE, other, other, stated);
        belongs(CandidateKeys.LOAD, transistor, transistor, stated);
        belongs(CandidateKeys.CURRENT, transistor, transistor, stated);
        belongs(CandidateKeys.IN_PARALLEL, transistor, false, stated);
        belongs(CandidateKeys.NEXT_STAGE, transistor, false, stated);
        boolean lead = transistor && arrangement != Arrangement.FOLLOWER;
        belongs(CandidateKeys.COMMON_LEAD, lead, false, stated);
        belongs(CandidateKeys.CASCODE, lead, false, stated);
        if (arrangement.isPair()) {
            fields.get(CandidateKeys.COMMON_LEAD).ifPresent(common -> {
                for (Key<Double> key :
                        List.of(CandidateKeys.LEAD_RESISTOR, CandidateKeys.BYPASS, CandidateKeys.BYPASS_ESR)) {
                    common.located(key)
                            .ifPresent(
                                    value -> faults.at(
                                            value.node(),
                                            "has no place in a pair, whose tail is ideal; only commonLead.unbypassed stands in each half"));
                }
            });
        }
    }

    /** A key that an arrangement wants, or has no use for. */
    private void belongs(Key<?> key, boolean useful, boolean needed, Located<Arrangement> arrangement) {
        Optional<Node> stated = fields.node().member(key.name());
        if (stated.isPresent() && !useful) {
            faults.at(
                    stated.get(),
                    "has no use in the arrangement " + arrangement.value().label() + "; remove it");
        } else if (stated.isEmpty() && needed) {
            faults.at(
                    fields.node(),
                    "has no " + key.name() + ", which the arrangement "
                            + arrangement.value().label() + " needs: " + key.description());
        }
    }

    private Optional<CurrentChoice> currentChoice(Node node) {
        if (node.kind() == Node.Kind.TEXT && node.text().equals(OPTIMUM)) {
            return Optional.of(new CurrentChoice.Optimum(OptionalDouble.empty(), OptionalDouble.empty(), deciding));
        }
        if (node.kind() == Node.Kind.OBJECT) {
            return CandidateKeys.OPEN_CURRENT
                    .read(node, faults)
                    .flatMap(open -> open.get(CandidateKeys.OPTIMUM))
                    .map(this::optimum);
        }
        if (node.kind() == Node.Kind.TEXT && node.text().chars().noneMatch(Character::isDigit)) {
            faults.at(node, "must be a current, like \"1.2 mA\", or \"" + OPTIMUM + "\", was " + node.quoted());
            return Optional.empty();
        }
        return CandidateKeys.GIVEN_CURRENT.read(node, faults).map(CurrentChoice.Given::new);
    }

    private CurrentChoice optimum(Fields search) {
        return new CurrentChoice.Optimum(
                optional(search.get(CandidateKeys.FROM)),
                optional(search.get(CandidateKeys.TO)),
                search.get(CandidateKeys.FOR, deciding));
    }

    private static OptionalDouble optional(Optional<Double> value) {
        return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
    }

    /** A current must be one that the device can carry. */
    private void checkCurrent() {
        if (device.isEmpty() || current.isEmpty()) {
            return;
        }
        Node node = fields.located(CandidateKeys.CURRENT).orElseThrow().node();
        double limit = device.get().ratedAmps().orElse(Double.POSITIVE_INFINITY);
        String why = "the current rating of " + device.get().id();
        if (device.get().kind() == DeviceKind.JFET) {
            double saturation = device.get()
                    .parameter(DeviceParameter.DRAIN_SATURATION_CURRENT)
                    .map(Parameter::representative)
                    .orElse(Double.POSITIVE_INFINITY);
            if (saturation < limit) {
                limit = saturation;
                why = "the typical IDSS of " + device.get().id();
            }
        }
        String atMost = Double.isInfinite(limit) ? "" : Quantities.brief(limit, "A", DIGITS);
        if (current.get() instanceof CurrentChoice.Given given && given.amps() > limit) {
            faults.at(node, "must not exceed " + why + ", " + atMost + ", was " + node.quoted());
        }
        if (current.get() instanceof CurrentChoice.Given given && given.amps() <= limit) {
            checkGainIsKnown(node, given.amps());
        }
        if (current.get() instanceof CurrentChoice.Optimum open) {
            double from = open.fromAmps().orElse(0.0);
            double to = open.toAmps().orElse(Double.POSITIVE_INFINITY);
            if (!(from < to)) {
                faults.at(node, "leaves no current to choose: from must be below to");
            } else if (from > limit) {
                faults.at(node, "leaves no current to choose: from is above " + why + ", " + atMost);
            }
        }
    }

    /** Beyond one decade from the published points nothing is known of the gain. */
    private void checkGainIsKnown(Node node, double amps) {
        device.flatMap(Device::currentGain)
                .filter(gain -> gain.points().size() > 1)
                .ifPresent(gain -> {
                    double first = gain.points().get(0).currentAmps() / Design.CONTINUED_FACTOR;
                    double last = gain.points().get(gain.points().size() - 1).currentAmps() * Design.CONTINUED_FACTOR;
                    if (amps < first * (1.0 - ROUNDING) || amps > last * (1.0 + ROUNDING)) {
                        faults.at(
                                node,
                                "lies more than one decade beyond the published current gain of "
                                        + device.orElseThrow().id() + "; state " + Quantities.brief(first, "A", DIGITS)
                                        + " to " + Quantities.brief(last, "A", DIGITS) + ", was " + node.quoted());
                    }
                });
    }

    /** The candidate, once the whole file was found free of faults. */
    Candidate candidate(double kelvin, Set<String> sharedNames) {
        Arrangement arrangement = fields.need(CandidateKeys.ARRANGEMENT);
        Surroundings around = new Surroundings(
                fields.get(CandidateKeys.COMMON_LEAD)
                        .map(CandidateReader::commonLead)
                        .orElse(CommonLead.grounded()),
                fields.get(CandidateKeys.LOAD).map(CandidateReader::load),
                fields.get(CandidateKeys.NEXT_STAGE).map(CandidateReader::nextStage),
                fields.get(CandidateKeys.CASCODE, false));
        return new Candidate(
                fields.need(CandidateKeys.NAME),
                device.orElseThrow(),
                new StagePlan(arrangement, fields.get(CandidateKeys.IN_PARALLEL, 1), around, pairParts(arrangement)),
                current.orElse(new CurrentChoice.None()),
                PathReader.elements(
                        fields.get(CandidateKeys.PATH).orElse(List.of()), kelvin, new HashSet<>(sharedNames)),
                fields.get(CandidateKeys.OPEN).map(OpenReader::values).orElse(List.of()));
    }

    private PairParts pairParts(Arrangement arrangement) {
        return switch (arrangement) {
            case GAIN_RESISTOR_PAIR ->
                PairParts.gain(fields.need(CandidateKeys.GAIN_RESISTOR), fields.need(CandidateKeys.FEEDBACK_RESISTOR));
            case SINGLE_ENDED_PAIR ->
                PairParts.otherSide(fields.need(CandidateKeys.OTHER_SIDE).need(CandidateKeys.OTHER_RESISTOR));
            default -> PairParts.none();
        };
    }

    private static CommonLead commonLead(Fields lead) {
        return new CommonLead(
                lead.get(CandidateKeys.UNBYPASSED, 0.0),
                lead.get(CandidateKeys.LEAD_RESISTOR, 0.0),
                lead.get(CandidateKeys.BYPASS, 0.0),
                lead.get(CandidateKeys.BYPASS_ESR, 0.0));
    }

    private static Passive.Resistor load(Fields load) {
        return PathReader.resistor(load, load.need(CandidateKeys.LOAD_RESISTOR));
    }

    private static NextStage nextStage(Fields stage) {
        return new NextStage(
                stage.need(CandidateKeys.VOLTAGE_NOISE),
                stage.get(CandidateKeys.VOLTAGE_NOISE_CORNER, 0.0),
                stage.get(CandidateKeys.CURRENT_NOISE, 0.0),
                stage.get(CandidateKeys.CURRENT_NOISE_CORNER, 0.0));
    }
}
