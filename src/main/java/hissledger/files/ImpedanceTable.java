package hissledger.files;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A measured impedance, read from CSV.
 *
 * @param hertz frequencies, Hz, rising
 * @param resistanceOhms Re Z, Ω
 * @param reactanceOhms Im Z, Ω
 */
record ImpedanceTable(List<Double> hertz, List<Double> resistanceOhms, List<Double> reactanceOhms) {
    private static final String CARTESIAN = "frequency_Hz,real_ohm,imag_ohm";
    private static final String POLAR = "frequency_Hz,magnitude_ohm,phase_deg";
    private static final int COLUMNS = 3;
    private static final int FEWEST_ROWS = 2;

    /** Reads a file; what is wrong with it goes to {@code faults}, and the result is then empty. */
    static Optional<ImpedanceTable> read(Path file, List<Fault> faults) {
        String name = file.toString();
        String content;
        try {
            content = JsonIn.text(name, JsonIn.bytes(file));
        } catch (InputException fault) {
            faults.addAll(fault.faults());
            return Optional.empty();
        }
        List<String> lines = content.lines().toList();
        int line = 0;
        while (line < lines.size()
                && (lines.get(line).isBlank() || lines.get(line).startsWith("#"))) {
            line++;
        }
        String header = line < lines.size() ? lines.get(line).strip() : "";
        if (!header.equals(CARTESIAN) && !header.equals(POLAR)) {
            faults.add(new Fault(
                    name,
                    line + 1,
                    1,
                    "",
                    "must begin with the header " + CARTESIAN + " or " + POLAR + ", was \"" + header + "\""));
            return Optional.empty();
        }
        ImpedanceTable table = new ImpedanceTable(new ArrayList<>(), new ArrayList<>(), new ArrayList<>());
        int before = faults.size();
        for (int k = line + 1; k < lines.size(); k++) {
            if (!lines.get(k).isBlank() && !lines.get(k).startsWith("#")) {
                table.add(name, k + 1, lines.get(k), header.equals(POLAR), faults);
            }
        }
        if (faults.size() > before) {
            return Optional.empty();
        }
        if (table.hertz.size() < FEWEST_ROWS) {
            faults.add(Fault.of(
                    name, "holds " + table.hertz.size() + " row of values; at least two are needed to interpolate"));
            return Optional.empty();
        }
        return Optional.of(table);
    }

    private void add(String file, int line, String text, boolean polar, List<Fault> faults) {
        String[] cells = text.split(",", -1);
        if (cells.length != COLUMNS) {
            faults.add(new Fault(file, line, 1, "", "must hold three values divided by commas, was \"" + text + "\""));
            return;
        }
        double[] values = new double[COLUMNS];
        int column = 1;
        for (int c = 0; c < COLUMNS; c++) {
            double value = number(cells[c].strip());
            if (!Double.isFinite(value)) {
                faults.add(
                        new Fault(file, line, column, "", "must be a finite number, was \"" + cells[c].strip() + "\""));
                return;
            }
            values[c] = value;
            column += cells[c].length() + 1;
        }
        if (!(values[0] > 0.0) || (!hertz.isEmpty() && values[0] <= hertz.get(hertz.size() - 1))) {
            faults.add(new Fault(
                    file,
                    line,
                    1,
                    "",
                    "frequencies must be > 0 Hz and rise from row to row; sort the rows and remove doubles"));
            return;
        }
        double phase = Math.toRadians(values[2]);
        double re = polar ? values[1] * Math.cos(phase) : values[1];
        double im = polar ? values[1] * Math.sin(phase) : values[2];
        if (re < 0.0) {
            faults.add(new Fault(
                    file,
                    line,
                    cells[0].length() + 2,
                    "",
                    "the real part of the impedance must be >= 0 ohm, was " + re
                            + " ohm: a passive source has no other"));
            return;
        }
        hertz.add(values[0]);
        resistanceOhms.add(re);
        reactanceOhms.add(im);
    }

    private static double number(String cell) {
        try {
            return Double.parseDouble(cell);
        } catch (NumberFormatException fault) {
            return Double.NaN;
        }
    }
}
