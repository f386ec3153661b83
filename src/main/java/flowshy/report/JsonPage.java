package flowshy.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import flowshy.math.Figures;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.function.Consumer;

/** Writes JSON into text; numbers through {@link Figures}, missing numbers as null with a reason. */
public final class JsonPage {
    private final StringWriter text = new StringWriter();
    /** Made with the first thing written, null until then: most runs write no JSON. */
    private JsonGenerator generator;

    private JsonGenerator out() {
        if (generator == null) {
            try {
                generator = new JsonFactory().createGenerator(text).useDefaultPrettyPrinter();
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
        return generator;
    }

    /**
     * Ends the page.
     *
     * @return the text, with a line end
     */
    public String finish() {
        run(out()::close);
        return text + "\n";
    }

    /**
     * An object at the top or in an array.
     *
     * @param fields writes its fields
     */
    public void object(Runnable fields) {
        run(out()::writeStartObject);
        fields.run();
        run(out()::writeEndObject);
    }

    /**
     * An array at the top.
     *
     * @param elements each writes one element
     */
    public void array(List<Runnable> elements) {
        run(out()::writeStartArray);
        elements.forEach(Runnable::run);
        run(out()::writeEndArray);
    }

    /**
     * A named object.
     *
     * @param name of the field
     * @param fields writes its fields
     */
    public void object(String name, Runnable fields) {
        run(() -> out().writeFieldName(name));
        object(fields);
    }

    /**
     * A named array of objects.
     *
     * @param name of the field
     * @param rows in order
     * @param fields writes the fields of one row
     * @param <T> what a row is made of
     */
    public <T> void array(String name, List<T> rows, Consumer<T> fields) {
        run(() -> out().writeArrayFieldStart(name));
        rows.forEach(row -> object(() -> fields.accept(row)));
        run(out()::writeEndArray);
    }

    /**
     * A named array of texts.
     *
     * @param name of the field
     * @param values in order
     */
    public void texts(String name, List<String> values) {
        run(() -> {
            out().writeArrayFieldStart(name);
            for (String value : values) {
                out().writeString(value);
            }
            out().writeEndArray();
        });
    }

    /**
     * A named array of numbers; what is not finite is null, and its reason stands beside the array.
     *
     * @param name of the field
     * @param values in order
     */
    void numbers(String name, List<Double> values) {
        run(() -> {
            out().writeArrayFieldStart(name);
            for (double value : values) {
                if (Double.isFinite(value)) {
                    out().writeNumber(Figures.full(value));
                } else {
                    out().writeNull();
                }
            }
            out().writeEndArray();
        });
    }

    /**
     * A text.
     *
     * @param name of the field
     * @param value any text
     */
    public void text(String name, String value) {
        run(() -> out().writeStringField(name, value));
    }

    /**
     * A truth.
     *
     * @param name of the field
     * @param value true or false
     */
    public void bool(String name, boolean value) {
        run(() -> out().writeBooleanField(name, value));
    }

    /**
     * A whole number.
     *
     * @param name of the field
     * @param value any
     */
    public void whole(String name, int value) {
        run(() -> out().writeNumberField(name, value));
    }

    /**
     * A number that is known to be finite.
     *
     * @param name of the field
     * @param value finite
     * @throws IllegalStateException if it is not: such a number needs a cell with a reason
     */
    public void number(String name, double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalStateException(name + " is not finite and has no reason");
        }
        run(() -> {
            out().writeFieldName(name);
            out().writeNumber(Figures.full(value));
        });
    }

    /**
     * A number or null with its reason beside it.
     *
     * @param name of the field
     * @param cell the number or its reason
     */
    void cell(String name, Cell cell) {
        if (cell.value().isPresent()) {
            number(name, cell.value().getAsDouble());
        } else {
            run(() -> out().writeNullField(name));
            text(name + "_reason", cell.reason());
        }
    }

    private static void run(Step step) {
        try {
            step.run();
        } catch (IOException e) { // a StringWriter never fails; the generator's signature says it could
            throw new UncheckedIOException(e);
        }
    }

    private interface Step {
        void run() throws IOException;
    }
}
