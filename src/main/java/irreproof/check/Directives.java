package irreproof.check;

import irreproof.check.judge.DeclaredNames;
import irreproof.engine.lie.DominantWeight;
import irreproof.latex.Comment;
import irreproof.latex.Reader;
import irreproof.naming.Groups;
import irreproof.naming.Resolution;
import irreproof.notation.GroupReader;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The directives of one document, in order. */
final class Directives {
    private static final Pattern MARK = Pattern.compile("^\\s*irreproof:\\s*(.*?)\\s*$");
    private static final Pattern WORD = Pattern.compile("^(\\S+)\\s*(.*)$");
    private static final Pattern NAME =
            Pattern.compile("^([\\w']+)\\s*=\\s*\\(\\s*(\\d{1,4}(?:\\s*,\\s*\\d{1,4})*)\\s*\\)$");

    private final List<Directive> all;

    private Directives(List<Directive> all) {
        this.all = List.copyOf(all);
    }

    static Directives read(List<Comment> comments) {
        List<Directive> found = new ArrayList<>();
        for (Comment comment : comments) {
            Matcher mark = MARK.matcher(comment.text());
            if (mark.matches()) {
                found.add(directive(mark.group(1), comment.span()));
            }
        }
        return new Directives(found);
    }

    private static Directive directive(String body, Span span) {
        Matcher parts = WORD.matcher(body);
        if (!parts.matches()) {
            return new Directive.Unreadable("it says nothing", span);
        }
        String rest = parts.group(2);
        switch (parts.group(1)) {
            case "group" -> {
                Optional<Resolution> group = group(rest);
                return group.isPresent()
                        ? new Directive.Group(group.get(), span)
                        : new Directive.Unreadable("\"" + rest + "\" is not a group such as SU(5)", span);
            }
            case "branching" -> {
                return rest.isEmpty()
                        ? new Directive.Unreadable("it names no groups, as in branching SO(10) -> SU(5) x U(1)", span)
                        : new Directive.Branching(rest, span);
            }
            case "name" -> {
                Matcher name = NAME.matcher(rest);
                return name.matches()
                        ? new Directive.Name(declaration(name.group(1), name.group(2)), span)
                        : new Directive.Unreadable("a name is declared as in name 15 = (4,0)", span);
            }
            case "allow" -> {
                return Rules.isRule(rest)
                        ? new Directive.Allow(rest, span)
                        : new Directive.Unreadable("there is no rule \"" + rest + "\"", span);
            }
            case "pause" -> {
                return new Directive.Pause(span);
            }
            case "resume" -> {
                return new Directive.Resume(span);
            }
            default -> {
                return new Directive.Unreadable("\"" + parts.group(1) + "\" is not a directive", span);
            }
        }
    }

    /** Reads a group typed by hand. */
    static Optional<Resolution> group(String typed) {
        return GroupReader.read(Reader.flatten(typed)).map(Groups::resolve);
    }

    List<Directive> all() {
        return all;
    }

    /** True if checking is paused at the offset. */
    boolean isPaused(int offset) {
        boolean paused = false;
        for (Directive directive : all) {
            if (directive.span().start() >= offset) {
                break;
            }
            if (directive instanceof Directive.Pause) {
                paused = true;
            } else if (directive instanceof Directive.Resume) {
                paused = false;
            }
        }
        return paused;
    }

    /** The setting in force at the offset: a {@link Directive.Group} or a {@link Directive.Branching}. */
    Optional<Directive> setting(int offset) {
        Directive last = null;
        for (Directive directive : all) {
            boolean sets = directive instanceof Directive.Group || directive instanceof Directive.Branching;
            if (sets && directive.span().start() < offset) {
                last = directive;
            }
        }
        return Optional.ofNullable(last);
    }

    /** How names are to be read in the whole document. */
    DeclaredNames declaredNames() {
        return new DeclaredNames(all.stream()
                .filter(Directive.Name.class::isInstance)
                .map(directive -> ((Directive.Name) directive).declaration())
                .toList());
    }

    private static DeclaredNames.Declaration declaration(String name, String labels) {
        int[] numbers = Arrays.stream(labels.split(","))
                .map(String::strip)
                .mapToInt(Integer::parseInt)
                .toArray();
        return new DeclaredNames.Declaration(name, DominantWeight.of(numbers));
    }
}
