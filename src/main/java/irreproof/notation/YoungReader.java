package irreproof.notation;

import irreproof.latex.TokenKind;
import irreproof.notation.parser.StatementParser;
import java.util.ArrayList;
import java.util.List;

/**
 * Reads the Young diagrams of the usual packages to their row lengths: {@code \yng(2,1)}, {@code \young(ab,c)},
 * {@code \ydiagram{2,1}}, {@code \ytableaushort{ab,c}} and the environment {@code ytableau}. Whatever is no diagram of a
 * partition (skew or offset shapes, rows that grow, a standard tableau) comes out unreadable.
 */
final class YoungReader {
    private static final int MOST_ROWS = 1000;
    private static final int LONGEST_NUMBER = 6;

    /** The ways to write a diagram. */
    enum Form {
        YNG,
        YOUNG,
        YDIAGRAM,
        SHORT,
        SINGLET
    }

    /** What was read, and where the tokens go on. */
    record Result(Lexeme lexeme, int next) {}

    private final TokenTape tape;

    YoungReader(TokenTape tape) {
        this.tape = tape;
    }

    /** @param index the place of the command */
    Result read(Form form, int index, int end) {
        return switch (form) {
            case SINGLET -> result(List.of(), index, index + 1);
            case YNG -> yng(index, end);
            case YOUNG -> young(index, end);
            case YDIAGRAM -> ydiagram(index, end);
            case SHORT -> tableauShort(index, end);
        };
    }

    private Result yng(int index, int end) {
        int open = tape.skipSpaces(index + 1, end);
        int close = closing(open, end);
        return close < 0 ? unreadable(index, index + 1) : result(lengths(open + 1, close), index, close + 1);
    }

    private Result young(int index, int end) {
        int open = tape.skipSpaces(index + 1, end);
        int close = closing(open, end);
        return close < 0 ? unreadable(index, index + 1) : result(boxes(open + 1, close), index, close + 1);
    }

    private Result ydiagram(int index, int end) {
        TokenTape.Argument shape = tape.argument(tape.skipOptional(index + 1, end), end);
        return shape == null
                ? unreadable(index, index + 1)
                : result(lengths(shape.from(), shape.to()), index, shape.next());
    }

    /** {@code \ytableaushort{..}*{shape}*[colour]{boxes}}: a shape, if given, replaces the entries. */
    private Result tableauShort(int index, int end) {
        TokenTape.Argument entries = tape.argument(index + 1, end);
        if (entries == null) {
            return unreadable(index, index + 1);
        }
        List<Integer> rows = null;
        int next = entries.next();
        while (tape.isCharacter(next, end, '*')) {
            int behind = tape.skipOptional(next + 1, end);
            TokenTape.Argument shape = tape.argument(behind, end);
            if (shape == null) {
                return unreadable(index, next);
            }
            if (behind == next + 1) {
                rows = lengths(shape.from(), shape.to());
                if (rows == null) {
                    return unreadable(index, shape.next());
                }
            }
            next = shape.next();
        }
        return result(rows != null ? rows : boxes(entries.from(), entries.to()), index, next);
    }

    /** The body of a {@code ytableau} environment. */
    Result environment(int index, int from, int to, int next) {
        List<Integer> rows = new ArrayList<>();
        int boxes = 0;
        boolean filled = false;
        boolean offset = false;
        for (int i = from; i <= to; i++) {
            boolean rowEnd = i == to
                    || tape.isKind(i, to, TokenKind.CONTROL_SYMBOL)
                            && tape.at(i).text().equals("\\");
            if (rowEnd || tape.isKind(i, to, TokenKind.ALIGN)) {
                boolean last = i == to && !filled && boxes == 0;
                boxes += last ? 0 : 1;
                if (rowEnd && boxes > 0) {
                    rows.add(boxes);
                    boxes = 0;
                }
            } else if (tape.at(i).isWord("none")) {
                offset = true;
            } else if (!tape.isBlank(i)) {
                filled = true;
            }
            filled &= !rowEnd;
        }
        return offset ? unreadable(index, next) : result(rows, index, next);
    }

    private int closing(int open, int end) {
        if (!tape.isCharacter(open, end, '(')) {
            return -1;
        }
        for (int i = open + 1; i < Math.min(end, open + TokenTape.FARTHEST_BRACKET); i++) {
            if (tape.at(i).isCharacter(')')) {
                return i;
            }
            if (tape.at(i).kind() == TokenKind.BEGIN_GROUP && tape.closer(i) >= 0) {
                i = tape.closer(i);
            }
        }
        return -1;
    }

    /** Numbers between commas; null if anything else stands there. */
    private List<Integer> lengths(int from, int to) {
        List<Integer> rows = new ArrayList<>();
        StringBuilder digits = new StringBuilder();
        for (int i = from; i <= to; i++) {
            if (i == to || tape.at(i).isCharacter(',')) {
                if (digits.isEmpty() || digits.length() > LONGEST_NUMBER) {
                    return null;
                }
                rows.add(Integer.parseInt(digits.toString()));
                digits.setLength(0);
            } else if (tape.at(i).kind() == TokenKind.DIGIT) {
                digits.append(tape.at(i).text());
            } else if (!tape.isBlank(i)) {
                return null;
            }
        }
        return rows;
    }

    /** One box for each token or group between commas; null for a standard tableau. */
    private List<Integer> boxes(int from, int to) {
        List<Integer> rows = new ArrayList<>();
        StringBuilder filling = new StringBuilder();
        int length = 0;
        int all = 0;
        for (int i = from; i <= to; i++) {
            if (i == to || tape.at(i).isCharacter(',')) {
                rows.add(length);
                length = 0;
            } else if (tape.at(i).isWord("none")) {
                return null;
            } else if (!tape.isBlank(i)) {
                if (tape.at(i).kind() == TokenKind.DIGIT) {
                    filling.append(tape.at(i).text());
                }
                if (tape.at(i).kind() == TokenKind.BEGIN_GROUP && tape.closer(i) >= 0 && tape.closer(i) < to) {
                    i = tape.closer(i);
                }
                length++;
                all++;
            }
        }
        boolean standard =
                all > 1 && filling.length() == all && filling.chars().distinct().count() == all;
        return standard ? null : rows;
    }

    private Result result(List<Integer> rows, int index, int next) {
        if (rows == null || rows.size() > MOST_ROWS) {
            return unreadable(index, next);
        }
        List<Integer> shape = new ArrayList<>(rows);
        while (!shape.isEmpty() && shape.get(shape.size() - 1) == 0) {
            shape.remove(shape.size() - 1);
        }
        for (int i = 1; i < shape.size(); i++) {
            if (shape.get(i) > shape.get(i - 1)) {
                return unreadable(index, next);
            }
        }
        return new Result(
                new Lexeme(StatementParser.DIAGRAM, new Lexeme.Shape(List.copyOf(shape)), tape.span(index, next)),
                next);
    }

    private Result unreadable(int index, int next) {
        return new Result(Lexeme.bare(StatementParser.UNREADABLE, tape.span(index, next)), next);
    }
}
