package irreproof.notation;

import irreproof.latex.Token;
import irreproof.latex.TokenKind;
import irreproof.notation.Expression.Face;
import irreproof.notation.Expression.PowerKind;
import irreproof.notation.Expression.Symmetry;
import irreproof.notation.parser.StatementParser;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads subscripts and superscripts: powers, primes, stars, parts, labels, charges. */
final class Scripts {
    private static final Pattern NUMERATOR = Pattern.compile("\\d{1,9}");
    private static final Pattern DENOMINATOR = Pattern.compile("[1-9]\\d{0,8}");
    private static final Pattern PRIMES_AND_STARS = Pattern.compile("['*]+");
    private static final Pattern EXPONENT = Pattern.compile("([⊗∧⊙∨]?)\\(?(\\d{1,6})\\)?");
    private static final Pattern POWER_OF_UNKNOWN_SIZE = Pattern.compile(".*[⊗∧⊙∨].*");
    /** {@code 2^{l-1}} is a number, no index. */
    private static final Pattern CALCULATION = Pattern.compile("\\(?(?:.+[+\\-].+|\\d.*|[+\\-].+)\\)?");

    private static final Pattern CHARGES =
            Pattern.compile("\\(?[+\\-±]?\\d+(?:/\\d+|\\.\\d+)?(?:[,;][+\\-±]?\\d+(?:/\\d+|\\.\\d+)?)*\\)?");
    private static final Pattern LABEL = Pattern.compile("[vsc]{1,3}|[+\\-]");
    private static final Set<String> SYMMETRIC = Set.of("S", "sym", "symm", "symmetric");
    private static final Set<String> ANTISYMMETRIC =
            Set.of("A", "a", "AS", "antisym", "antisymm", "antisymmetric", "anti", "asym", "asymm");
    private static final Map<String, String> SIGNS = Map.ofEntries(
            Map.entry("prime", "'"),
            Map.entry("ast", "*"),
            Map.entry("star", "*"),
            Map.entry("pm", "±"),
            Map.entry("otimes", "⊗"),
            Map.entry("wedge", "∧"),
            Map.entry("bigwedge", "∧"),
            Map.entry("odot", "⊙"),
            Map.entry("vee", "∨"));

    private static final int DEEPEST_FRACTION = 3;

    private Scripts() {}

    /** Reads the script that begins here and returns where reading goes on. */
    static int read(TokenTape tape, int i, int to, List<Lexeme> lexemes) {
        TokenTape.Argument argument = tape.argument(i + 1, to);
        if (argument == null) {
            lexemes.add(Lexeme.bare(StatementParser.UNREADABLE, tape.span(i, i + 1)));
            return i + 1;
        }
        Span span = tape.span(i, argument.next());
        Lexeme base = lexemes.isEmpty() ? null : lexemes.get(lexemes.size() - 1);
        boolean below = tape.at(i).kind() == TokenKind.SUBSCRIPT;
        if (base != null && base.is(StatementParser.OTIMES)) {
            productScript(subscript(tape, argument), below, span, lexemes);
        } else if (base == null || !base.is(StatementParser.RELATION)) {
            if (below) {
                addSubscript(subscript(tape, argument), span, lexemes);
            } else {
                lexemes.addAll(superscript(tape, argument, span));
            }
        }
        return argument.next();
    }

    /** Adds a remark as if it were a subscript. */
    static void addSubscript(TokenTape tape, TokenTape.Argument remark, Span span, List<Lexeme> lexemes) {
        addSubscript(subscript(tape, remark), span, lexemes);
    }

    static boolean saysPart(TokenTape tape, TokenTape.Argument remark) {
        return subscript(tape, remark).meaning() instanceof ScriptMeaning.Part;
    }

    private static void addSubscript(Lexeme.Script script, Span span, List<Lexeme> lexemes) {
        if (!(script.meaning() instanceof ScriptMeaning.Nothing)) {
            lexemes.add(new Lexeme(StatementParser.SUBSCRIPT, script, span));
        }
    }

    /** {@code \otimes_S}; the ring under a tensor sign ({@code \otimes_{\mathbb{C}}}) says nothing about irreps. */
    private static void productScript(Lexeme.Script script, boolean below, Span span, List<Lexeme> lexemes) {
        int last = lexemes.size() - 1;
        if (below && script.meaning() instanceof ScriptMeaning.Part part) {
            Span whole = lexemes.get(last).span().cover(span);
            lexemes.set(last, new Lexeme(StatementParser.OTIMES, new Lexeme.Projected(part.symmetry()), whole));
        } else if (!below || !script.written().contains("mathbb")) {
            lexemes.add(Lexeme.bare(StatementParser.UNREADABLE, span));
        }
    }

    /** Reads a fraction command; only fractions of whole numbers can be read. */
    static int fraction(TokenTape tape, int i, int to, Face face, List<Lexeme> lexemes) {
        TokenTape.Argument over = tape.argument(tape.skipOptional(i + 1, to), to);
        TokenTape.Argument under = over == null ? null : tape.argument(over.next(), to);
        if (under == null) {
            lexemes.add(Lexeme.bare(StatementParser.UNREADABLE, tape.span(i, i + 1)));
            return i + 1;
        }
        String numerator = plain(tape, over.from(), over.to());
        String denominator = plain(tape, under.from(), under.to());
        Span span = tape.span(i, under.next());
        boolean whole = NUMERATOR.matcher(numerator).matches()
                && DENOMINATOR.matcher(denominator).matches();
        lexemes.add(
                whole
                        ? new Lexeme(StatementParser.FRACTION, new Lexeme.Fraction(numerator, denominator, face), span)
                        : Lexeme.bare(StatementParser.UNREADABLE, span));
        return under.next();
    }

    /** The lexemes of a superscript; none if it says nothing. */
    private static List<Lexeme> superscript(TokenTape tape, TokenTape.Argument argument, Span span) {
        String text = plain(tape, argument.from(), argument.to()).replace('\u2217', '*');
        List<Lexeme> lexemes = new ArrayList<>();
        Matcher exponent = EXPONENT.matcher(text);
        if (PRIMES_AND_STARS.matcher(text).matches()) {
            int primes = (int) text.chars().filter(c -> c == '\'').count();
            addCount(lexemes, StatementParser.PRIMES, primes, span);
            addCount(lexemes, StatementParser.STARS, text.length() - primes, span);
        } else if (exponent.matches()) {
            lexemes.add(exponent(StatementParser.EXPONENT, exponent, span));
        } else if (POWER_OF_UNKNOWN_SIZE.matcher(text).matches()
                || CALCULATION.matcher(text).matches()) {
            lexemes.add(Lexeme.bare(StatementParser.UNREADABLE, span));
        } else if (text.equals("c") || text.contains("dagger") || text.contains("oplus") || text.contains("\u2295")) {
            // A conjugate or several copies: leaving it out would change what is asserted.
            lexemes.add(Lexeme.bare(StatementParser.UNREADABLE, span));
        } else if (!text.isEmpty()) {
            ScriptMeaning meaning =
                    LABEL.matcher(text).matches() && text.length() == 1 && !Character.isLetter(text.charAt(0))
                            ? new ScriptMeaning.Label(text)
                            : new ScriptMeaning.Other();
            lexemes.add(new Lexeme(StatementParser.SUPERSCRIPT, script(meaning, tape, argument), span));
        }
        return lexemes;
    }

    private static void addCount(List<Lexeme> lexemes, int type, int count, Span span) {
        if (count > 0) {
            lexemes.add(new Lexeme(type, new Lexeme.Count(count), span));
        }
    }

    private static Lexeme exponent(int type, Matcher exponent, Span span) {
        PowerKind kind = switch (exponent.group(1)) {
            case "∧" -> PowerKind.EXTERIOR;
            case "⊙", "∨" -> PowerKind.SYMMETRIC;
            default -> PowerKind.TENSOR;
        };
        boolean operator = !exponent.group(1).isEmpty();
        return new Lexeme(type, new Lexeme.Exponent(kind, Integer.parseInt(exponent.group(2)), operator), span);
    }

    /** The exponent of a power written in front ({@code \Lambda^2}), or -1 if the superscript is none. */
    static int plainExponent(TokenTape tape, TokenTape.Argument argument) {
        Matcher exponent = EXPONENT.matcher(plain(tape, argument.from(), argument.to()));
        return exponent.matches() && exponent.group(1).isEmpty() ? Integer.parseInt(exponent.group(2)) : -1;
    }

    private static Lexeme.Script subscript(TokenTape tape, TokenTape.Argument argument) {
        return script(meaning(plain(tape, argument.from(), argument.to())), tape, argument);
    }

    private static Lexeme.Script script(ScriptMeaning meaning, TokenTape tape, TokenTape.Argument argument) {
        return new Lexeme.Script(meaning, tape.text(argument.from(), argument.to()));
    }

    private static ScriptMeaning meaning(String text) {
        if (text.isEmpty()) {
            return new ScriptMeaning.Nothing();
        }
        String word = text.length() > 1 ? text.toLowerCase(Locale.ROOT) : text;
        if (SYMMETRIC.contains(text) || SYMMETRIC.contains(word)) {
            return new ScriptMeaning.Part(Symmetry.SYMMETRIC);
        }
        if (ANTISYMMETRIC.contains(text) || ANTISYMMETRIC.contains(word)) {
            return new ScriptMeaning.Part(Symmetry.ANTISYMMETRIC);
        }
        if (LABEL.matcher(text).matches()) {
            return new ScriptMeaning.Label(text);
        }
        if (CHARGES.matcher(text).matches()) {
            String list = text.startsWith("(") && text.endsWith(")") ? text.substring(1, text.length() - 1) : text;
            return new ScriptMeaning.Charges(List.of(list.split("[,;]")));
        }
        return new ScriptMeaning.Other();
    }

    /** The tokens without styling and blanks; fractions as {@code 1/2}, an unknown command with its backslash. */
    static String plain(TokenTape tape, int from, int to) {
        return plain(tape, from, to, 0);
    }

    private static String plain(TokenTape tape, int from, int to, int depth) {
        StringBuilder text = new StringBuilder();
        for (int i = from; i < to; i++) {
            Token token = tape.at(i);
            if (token.kind() == TokenKind.CONTROL_WORD) {
                Commands.Meaning meaning = Commands.of(token.text());
                if (SIGNS.containsKey(token.text())) {
                    text.append(SIGNS.get(token.text()));
                } else if (meaning instanceof Commands.FractionOf && depth < DEEPEST_FRACTION) {
                    TokenTape.Argument over = tape.argument(i + 1, to);
                    TokenTape.Argument under = over == null ? null : tape.argument(over.next(), to);
                    if (under != null) {
                        text.append(plain(tape, over.from(), over.to(), depth + 1))
                                .append('/')
                                .append(plain(tape, under.from(), under.to(), depth + 1));
                        i = under.next() - 1;
                    }
                } else if (!isStyle(meaning)) {
                    text.append('\\').append(token.text());
                }
            } else if (token.kind() == TokenKind.SUPERSCRIPT || token.kind() == TokenKind.SUBSCRIPT) {
                text.append(token.kind() == TokenKind.SUPERSCRIPT ? '^' : '_');
            } else if (token.kind() == TokenKind.LETTER
                    || token.kind() == TokenKind.DIGIT
                    || token.kind() == TokenKind.OTHER) {
                text.append(token.text());
            }
        }
        return text.toString()
                .replace('−', '-')
                .replace('’', '\'')
                .replace("′", "'")
                .replace("~", "");
    }

    private static boolean isStyle(Commands.Meaning meaning) {
        return meaning instanceof Commands.Faced
                || meaning instanceof Commands.FaceSwitch
                || meaning instanceof Commands.Text
                || meaning instanceof Commands.Space
                || meaning instanceof Commands.Wrapper
                || meaning instanceof Commands.Delimiter
                || meaning instanceof Commands.Dropped;
    }
}
