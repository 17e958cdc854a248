package shuntwright.io.json;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.json.JsonReadFeature;

/** Builds the tree of located values from JSON text. */
public final class JsonTree {
    /** Deepest nesting of objects and lists that is read; the files of this program need fewer than ten. */
    static final int DEEPEST = 64;

    /** Of a number's digits, as messages show them. */
    private static final int LONGEST_SHOWN = 40;

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .streamReadConstraints(StreamReadConstraints.builder().maxNumberLength(Integer.MAX_VALUE).build())
            .enable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS).build();

    private final JsonParser parser;
    private final Problems problems;

    private JsonTree(JsonParser parser, Problems problems) {
        this.parser = parser;
        this.problems = problems;
    }

    /** The text's one value; empty, with the reason in {@code problems}, where the text is not JSON. */
    public static Optional<LocatedJson> parse(String text, Problems problems) {
        try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), text)) {
            JsonTree tree = new JsonTree(parser, problems);
            JsonToken first = parser.nextToken();
            if (first == null) {
                problems.add(Place.WHOLE_FILE, "the file is empty");
                return Optional.empty();
            }
            LocatedJson root = tree.value(first, "", 1);
            if (parser.nextToken() != null) {
                problems.add(tree.here(""), "there is more text after the end of the file's object; remove it, or "
                        + "check for a brace too many before it");
                return Optional.empty();
            }
            return Optional.of(root);
        } catch (TooDeep e) {
            problems.add(e.place, "objects and lists are nested more than " + DEEPEST + " deep here");
            return Optional.empty();
        } catch (JacksonException e) {
            TokenStreamLocation at = e.getLocation();
            Place place = at == null ? Place.WHOLE_FILE : new Place(at.getLineNr(), at.getColumnNr(), "");
            int offset = at == null ? -1 : (int) at.getCharOffset();
            problems.add(place, SyntaxWords.of(e.getOriginalMessage(), text, offset));
            return Optional.empty();
        }
    }

    private Place here(String path) {
        TokenStreamLocation at = parser.currentTokenLocation();
        return new Place(at.getLineNr(), at.getColumnNr(), path);
    }

    private LocatedJson value(JsonToken token, String path, int depth) {
        Place place = here(path);
        if (depth > DEEPEST) {
            throw new TooDeep(place);
        }
        if (token == JsonToken.START_OBJECT) {
            return object(place, depth);
        }
        if (token == JsonToken.START_ARRAY) {
            List<LocatedJson> elements = new ArrayList<>();
            for (JsonToken next = parser.nextToken(); next != JsonToken.END_ARRAY; next = parser.nextToken()) {
                elements.add(value(next, Place.element(path, elements.size()), depth + 1));
            }
            return new LocatedJson.Arr(place, elements);
        }
        if (token == JsonToken.VALUE_STRING) {
            return new LocatedJson.Text(place, parser.getString());
        }
        if (token.isNumeric()) {
            String written = parser.getString();
            double value = parser.isNaN() ? Double.NaN : Double.parseDouble(written);
            return new LocatedJson.Num(place, value,
                    written.length() > LONGEST_SHOWN ? written.substring(0, LONGEST_SHOWN) + "…" : written);
        }
        return token.isBoolean()
                ? new LocatedJson.Bool(place, token == JsonToken.VALUE_TRUE)
                : new LocatedJson.Null(place);
    }

    private LocatedJson object(Place place, int depth) {
        List<LocatedJson.Member> members = new ArrayList<>();
        Set<String> keys = new HashSet<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String key = parser.currentName();
            Place keyPlace = here(Place.child(place.path(), key));
            LocatedJson value = value(parser.nextToken(), keyPlace.path(), depth + 1);
            if (keys.add(key)) {
                members.add(new LocatedJson.Member(keyPlace, key, value));
            } else {
                problems.add(keyPlace, "the key \"" + key + "\" stands twice in this object; keep one of them");
            }
        }
        return new LocatedJson.Obj(place, members);
    }

    private static final class TooDeep extends RuntimeException {
        private static final long serialVersionUID = 1;

        private final transient Place place;

        TooDeep(Place place) {
            super("nested too deep", null, false, false);
            this.place = place;
        }
    }
}
