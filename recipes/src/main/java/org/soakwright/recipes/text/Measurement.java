package org.soakwright.recipes.text;

import java.math.BigDecimal;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * A number and what follows it, as written: {@code 8e-10 m2/s}. The number is decimal and finite.
 *
 * @param written the number in the characters of the file
 */
public record Measurement(String written, BigDecimal number, String unit) {
    // Possessive, and no unit like an exponent, so that a unit never begins with the end of a number.
    private static final Pattern NUMBER_AND_UNIT = Pattern.compile(
            "([+-]?+[0-9]{1,20}+(?:\\.[0-9]{1,20}+)?+(?:[eE][+-]?+[0-9]{1,3}+)?+)(?: *+((?![eE][+-]?[0-9])[^0-9., _:+-].*+)|  *+(1))?+");
    private static final Pattern TOO_MANY_DIGITS = Pattern.compile("[+-]?+(?:[0-9]{21}|[0-9]{1,20}\\.[0-9]{21}).*+");
    private static final Pattern TOO_LONG_EXPONENT =
            Pattern.compile("[+-]?+[0-9]++(?:\\.[0-9]++)?+[eE][+-]?+[0-9]{4}.*+");
    private static final Pattern COMMA = Pattern.compile("[+-]?[0-9]+,[0-9]+.*");
    private static final Pattern NOT_FINITE = Pattern.compile("[+-]?\\.?(nan|inf|infinity)\\b.*");

    /** The measurement in the text, if it is one. */
    public static Optional<Measurement> of(String text) {
        Matcher matcher = NUMBER_AND_UNIT.matcher(text);
        if (!matcher.matches()) {
            return Optional.empty();
        }
        String unit = matcher.group(2) != null ? matcher.group(2) : matcher.group(3);
        return Optional.of(
                new Measurement(matcher.group(1), new BigDecimal(matcher.group(1)), unit == null ? "" : unit.strip()));
    }

    /** Why the text is no measurement: what was found and, where it can be guessed, what was meant. */
    public static String whyNot(String text) {
        if (text.isBlank()) {
            return "found nothing";
        }
        String found = "found " + Shown.quoted(text);
        if (COMMA.matcher(text).matches()) {
            return found + " with a comma, decimals take a point";
        }
        if (NOT_FINITE.matcher(text.toLowerCase(Locale.ROOT)).matches()) {
            return found + ", which is not a finite number";
        }
        if (TOO_LONG_EXPONENT.matcher(text).matches()) {
            return found + ", a number too large or too small to hold";
        }
        if (TOO_MANY_DIGITS.matcher(text).matches()) {
            return found + ", a number too long to hold, of more than 20 digits before or after its point";
        }
        return found + ", which does not begin with a plain number";
    }

    /** Why the unit is not one of the kinds wanted. */
    public static String wrongUnit(String text, String unit, Collection<Kind> wanted) {
        String found = "found " + Shown.quoted(text);
        if (unit.isEmpty()) {
            return found + " without a unit";
        }
        Optional<Kind> other = Kind.having(unit).filter(kind -> !wanted.contains(kind));
        return found + (other.isPresent() ? ", " + other.get().label() : " in an unknown unit") + expected(wanted);
    }

    private static String expected(Collection<Kind> wanted) {
        return ", where " + alternatives(wanted.stream().map(Kind::label).toList()) + " is needed";
    }

    /** What to write instead: {@code write such as 6 h (s, min, h, d, wk)}. */
    public static String remedy(Collection<Kind> wanted) {
        String examples = alternatives(wanted.stream().map(Kind::example).toList());
        String labels = alternatives(wanted.stream().map(Kind::label).toList());
        String units = wanted.stream().map(Kind::usual).collect(Collectors.joining(", "));
        return "write " + labels + " such as " + examples + " (units such as " + units + ")";
    }

    /** {@code a, b or c}. */
    private static String alternatives(List<String> words) {
        int last = words.size() - 1;
        return last == 0 ? words.get(0) : String.join(", ", words.subList(0, last)) + " or " + words.get(last);
    }
}
