package irreproof.latex;

import irreproof.text.SourceText;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Walks through one document's expanded tokens: prose, headings, paragraphs, and a passage wherever one opens. */
final class DocumentReader {
    private static final Map<String, Integer> HEADINGS = Map.ofEntries(
            Map.entry("title", 0),
            Map.entry("part", 1),
            Map.entry("chapter", 1),
            Map.entry("section", 2),
            Map.entry("subsection", 3),
            Map.entry("subsubsection", 4),
            Map.entry("paragraph", 5),
            Map.entry("subparagraph", 6),
            Map.entry("frametitle", 4));

    private final SourceText source;
    private final Expander expander;
    private final Reading reading;
    private final Inclusions inclusions;
    private final Flattener prose = new Flattener();
    private final List<Passage> passages = new ArrayList<>();
    private final List<Heading> headings = new ArrayList<>();
    private final List<Span> paragraphs = new ArrayList<>();
    /** The paragraph being read, or null between paragraphs. */
    private Span paragraph;
    /** Offset up to which tokens belong to a heading. */
    private int headingEnd;

    private boolean preamble;
    private boolean ended;

    DocumentReader(SourceText source, Reading reading, Inclusions inclusions) {
        this.source = source;
        this.reading = reading;
        this.inclusions = inclusions;
        this.expander = new Expander(source.path(), source.content(), reading, inclusions);
        this.preamble = Preamble.opens(source.content());
    }

    LatexDocument read(List<SourceText> roots) {
        roots.forEach(inclusions::readRoot);
        Token token = expander.next();
        while (token != null && !ended) {
            accept(token);
            token = expander.next();
        }
        endParagraph();
        return new LatexDocument(
                source,
                passages,
                headings,
                paragraphs,
                expander.comments(),
                prose.result(),
                reading.macros(),
                reading.problems());
    }

    /** The whole source as one inline formula, or its first passage if it has math shifts or environments of its own. */
    Optional<Passage> formula() {
        Token first = expander.next();
        while (first != null && first.kind() == TokenKind.SPACE) {
            first = expander.next();
        }
        if (first == null) {
            return Optional.empty();
        }
        if (first.kind() == TokenKind.INLINE_SHIFT
                || first.kind() == TokenKind.DISPLAY_SHIFT
                || first.isWord("begin")) {
            expander.push(first);
            return read(List.of()).passages().stream().findFirst();
        }
        expander.push(first);
        Token opener = new Token(
                TokenKind.INLINE_SHIFT,
                "$",
                new Span(first.span().start(), first.span().start()));
        return Optional.ofNullable(new PassageReader(expander, prose, opener, "$").read());
    }

    private void accept(Token token) {
        switch (token.kind()) {
            case INLINE_SHIFT, DISPLAY_SHIFT -> {
                if (isVisible(token)
                        && !token.text().equals("\\)")
                        && !token.text().equals("\\]")) {
                    passage(token, token.text());
                }
            }
            case PARAGRAPH_BREAK -> {
                endParagraph();
                show(token);
            }
            case BEGIN_GROUP -> {
                if (!preamble) {
                    reading.macros().openGroup();
                }
                show(token);
            }
            case END_GROUP -> {
                if (!preamble) {
                    reading.macros().closeGroup();
                }
                show(token);
            }
            case CONTROL_WORD -> word(token);
            case LETTER, DIGIT, OTHER, CONTROL_SYMBOL, ALIGN, SUPERSCRIPT, SUBSCRIPT, SPACE -> show(token);
            case PARAMETER, COMMENT, VERBATIM -> {
                // neither prose nor mathematics
            }
        }
    }

    private void show(Token token) {
        if (!isVisible(token)) {
            return;
        }
        if (token.kind() != TokenKind.SPACE && token.kind() != TokenKind.PARAGRAPH_BREAK) {
            touch(token.span());
        }
        prose.accept(token);
    }

    /** Of a preamble, only the title is. */
    private boolean isVisible(Token token) {
        return !preamble || token.span().start() < headingEnd;
    }

    private void touch(Span span) {
        if (span.start() >= headingEnd) {
            paragraph = paragraph == null ? span : paragraph.cover(span);
        }
    }

    private void endParagraph() {
        if (paragraph != null) {
            paragraphs.add(paragraph);
        }
        paragraph = null;
    }

    private void word(Token token) {
        Integer level = HEADINGS.get(token.text());
        if (level != null) {
            heading(token, level);
            return;
        }
        switch (token.text()) {
            case "begin" -> begin(token);
            case "end" -> end();
            case "ensuremath" -> ensuredMathematics(token);
            case "par" -> {
                endParagraph();
                show(new Token(TokenKind.PARAGRAPH_BREAK, "\n\n", token.span()));
            }
            case "bgroup", "begingroup" -> {
                if (!preamble) {
                    reading.macros().openGroup();
                }
            }
            case "egroup", "endgroup" -> {
                if (!preamble) {
                    reading.macros().closeGroup();
                }
            }
            case "footnote", "caption", "footnotetext" -> {
                prose.blank(token.span());
                show(token);
            }
            default -> show(token);
        }
    }

    private void heading(Token word, int level) {
        Arguments arguments = expander.arguments();
        arguments.star();
        arguments.optional();
        List<Token> title = arguments.mandatory();
        if (title == null) {
            return;
        }
        Span span = word.span();
        for (Token token : arguments.lastTaken()) {
            span = span.cover(token.span());
        }
        endParagraph();
        prose.paragraph(word.span());
        headings.add(new Heading(level, span));
        headingEnd = span.end();
        List<Token> content = new ArrayList<>(title);
        content.add(new Token(TokenKind.PARAGRAPH_BREAK, "\n\n", span));
        expander.push(content);
    }

    private void begin(Token token) {
        String name = expander.arguments().name();
        if (name == null) {
            return;
        }
        Span span = token.span();
        for (Token part : expander.arguments().lastTaken()) {
            span = span.cover(part.span());
        }
        if (name.equals("document")) {
            preamble = false;
            return;
        }
        if (preamble) {
            return;
        }
        if (MathEnvironments.isDisplay(name) || MathEnvironments.isTable(name)) {
            passage(token.at(span), name);
            return;
        }
        reading.macros().openGroup();
        for (char kind : MathEnvironments.arguments(name).toCharArray()) {
            if (kind == 'o') {
                expander.arguments().optional();
            } else {
                expander.arguments().mandatory();
            }
        }
        prose.blank(token.span());
    }

    private void end() {
        String name = expander.arguments().name();
        if ("document".equals(name)) {
            ended = true;
        } else if (!preamble) {
            reading.macros().closeGroup();
        }
    }

    private void ensuredMathematics(Token token) {
        List<Token> argument = expander.arguments().mandatory();
        if (argument == null || !isVisible(token)) {
            return;
        }
        List<Token> formula = new ArrayList<>(argument);
        formula.add(new Token(TokenKind.INLINE_SHIFT, "$", token.span()));
        expander.push(formula);
        passage(token, "$");
    }

    private void passage(Token opener, String environment) {
        boolean inline = environment.equals("$") || environment.equals("\\(") || environment.equals("math");
        if (!inline) {
            prose.blank(opener.span());
        }
        PassageReader reader = new PassageReader(expander, prose, opener, environment);
        Passage passage = reader.read();
        touch(reader.span());
        if (!inline) {
            prose.blank(reader.span());
        }
        if (!reader.isClosed()) {
            reading.report("the formula that begins in line "
                    + (source.lines().position(opener.span().start()).line() + 1) + " does not end");
        }
        if (passage != null) {
            passages.add(passage);
        }
    }
}
