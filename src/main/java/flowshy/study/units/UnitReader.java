package flowshy.study.units;

import flowshy.study.text.Printable;
import java.util.Optional;

/**
 * Reads products, quotients, powers and roots of the symbols of {@link UnitTable}: {@code N.m/rad}, {@code kg/(m.s)},
 * {@code m s-2}, {@code rad/√Hz}.
 */
final class UnitReader {
    private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    /** Beyond the ninth power nothing is measured. */
    private static final int HIGHEST_POWER = 9;

    private static final int DEEPEST = 4;

    private final String text;
    private final boolean gravity;
    private int at;
    private int depth;

    private UnitReader(String text, boolean gravity) {
        this.text = text;
        this.gravity = gravity;
    }

    /**
     * Reads a unit.
     *
     * @throws UnitFault if it is not one
     */
    static Unit read(String text, boolean gravity) throws UnitFault {
        UnitReader reader = new UnitReader(plain(text), gravity);
        Unit unit = reader.product();
        if (reader.at < reader.text.length()) {
            throw new UnitFault("unit " + Printable.of(text) + " has a bracket too many", Optional.empty());
        }
        return unit;
    }

    /** One spelling for powers, percent and degrees of temperature. */
    private static String plain(String text) {
        StringBuilder out = new StringBuilder();
        boolean raised = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            int digit = SUPERSCRIPTS.indexOf(c);
            boolean up = digit >= 0 || c == '⁻';
            if (up && !raised) {
                out.append('^');
            }
            out.append(digit >= 0 ? (char) ('0' + digit) : c == '⁻' || c == '\u2212' ? '-' : c);
            raised = up;
        }
        return out.toString()
                .replace("**", "^")
                .replaceAll("(deg|°) +([CF])\\b", "$1$2")
                .replaceAll("% *(RH|rh|r\\.h\\.)$", "%RH")
                .strip();
    }

    private Unit product() throws UnitFault {
        Unit unit = Unit.ONE.times(power(), 2);
        boolean divided = false;
        while (true) {
            int start = at;
            skipBlanks();
            if (at == text.length() || text.charAt(at) == ')') {
                return unit;
            }
            if (text.charAt(at) == '/') {
                at++;
                divided = true;
                unit = unit.times(power(), -2);
            } else if (divided) {
                throw new UnitFault(
                        "unit " + Printable.of(text) + " is ambiguous after the stroke", Optional.of(bracketed(start)));
            } else {
                skipTimes();
                unit = unit.times(power(), 2);
            }
        }
    }

    private String bracketed(int start) {
        int stroke = text.lastIndexOf('/', start);
        return Printable.of(text.substring(0, stroke + 1) + "(" + text.substring(stroke + 1) + ")");
    }

    private Unit power() throws UnitFault {
        skipBlanks();
        Unit base = base();
        int halves = exponent();
        return halves == 0 ? Unit.ONE : Unit.ONE.times(base, halves);
    }

    private Unit base() throws UnitFault {
        if (take("√") || take("sqrt")) {
            return Unit.ONE.times(base(), 1);
        }
        if (take("(")) {
            if (++depth > DEEPEST) {
                throw new UnitFault("unit has more than " + DEEPEST + " brackets in each other", Optional.empty());
            }
            Unit inner = product();
            depth--;
            if (!take(")")) {
                throw new UnitFault("unit " + Printable.of(text) + " lacks a closing bracket", Optional.empty());
            }
            return inner;
        }
        if (at == 0 && (text.startsWith("1/") || text.startsWith("1 /"))) {
            at = 1;
            return Unit.ONE;
        }
        return symbol();
    }

    private Unit symbol() throws UnitFault {
        int start = at;
        while (at < text.length() && isSymbol(text.charAt(at))) {
            at++;
        }
        String symbol = text.substring(start, at);
        Optional<Unit> unit = UnitTable.find(symbol, gravity);
        if (unit.isEmpty() && symbol.startsWith("rt")) {
            unit = UnitTable.find(symbol.substring(2), gravity).map(u -> Unit.ONE.times(u, 1));
        }
        return unit.orElseThrow(() -> symbol.isEmpty()
                ? new UnitFault("unit " + Printable.of(text) + " breaks off or starts wrongly", Optional.empty())
                : new UnitFault("unknown unit " + Printable.of(symbol), Optional.of(symbol)));
    }

    private static boolean isSymbol(char c) {
        return Character.isLetter(c) || "%°‰".indexOf(c) >= 0 || c == '\u2103' || c == '\u2109';
    }

    /** Exponent in halves; 2 where none is written. */
    private int exponent() throws UnitFault {
        boolean raised = take("^");
        if (raised && (take("0.5") || take("(1/2)"))) {
            return 1;
        }
        int start = at;
        boolean negative = at + 1 < text.length() && Character.isDigit(text.charAt(at + 1)) && take("-");
        int value = 0;
        while (at < text.length() && Character.isDigit(text.charAt(at)) && value <= HIGHEST_POWER) {
            value = 10 * value + Character.digit(text.charAt(at++), 10);
        }
        if (at == start && !raised) {
            return 2;
        }
        if (at == start || value > HIGHEST_POWER) {
            throw new UnitFault("unit " + Printable.of(text) + " has no usable power", Optional.empty());
        }
        return negative ? -2 * value : 2 * value;
    }

    /** Multiplication: a dot, a cross, a hyphen, or only a blank. */
    private void skipTimes() {
        if (".·⋅∙*×-".indexOf(text.charAt(at)) >= 0) {
            at++;
        }
    }

    private void skipBlanks() {
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
    }

    private boolean take(String mark) {
        boolean there = text.startsWith(mark, at);
        if (there) {
            at += mark.length();
        }
        return there;
    }

    /** What is wrong with a unit, before it is known where it stood and what was wanted. */
    static final class UnitFault extends Exception {
        private static final long serialVersionUID = 1L;
        private final String hint;

        UnitFault(String message, Optional<String> hint) {
            super(message);
            this.hint = hint.orElse("");
        }

        /** The unknown symbol, or the spelling that would be clear. */
        Optional<String> hint() {
            return Optional.of(hint).filter(text -> !text.isEmpty());
        }
    }
}
