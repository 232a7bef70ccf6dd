package irreproof.check;

import irreproof.check.SettingCandidate.Nearness;
import irreproof.latex.Heading;
import irreproof.latex.LatexDocument;
import irreproof.naming.Groups;
import irreproof.naming.Resolution;
import irreproof.naming.SymplecticUsage;
import irreproof.notation.GroupName;
import irreproof.notation.GroupReader;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * Where a statement's group comes from: a directive settles it; otherwise the groups named in its own passage, its
 * paragraph, the headings above it and the rest of the document, nearest first (what stands before the statement wins
 * over what stands behind); a default group only where the document names none. Group names are found once for each
 * document; a statement costs one pass over them.
 */
final class Settings {
    private static final int MOST = 12;
    private static final Pattern OTHER_MATTERS = Pattern.compile(
            "(?i:(discrete|finite|permutation|alternating|point)[ ~\\n](sub)?(group|symmetr)|binary[ ~](tetra|octa|icosa)"
                    + "|in characteristic|fusion[ ~]r|quantum group|identical (particle|fermion|boson)|modulo)"
                    + "|PSL|\\\\Delta *\\(|\\\\Sigma *\\(|\\bA_\\{?[45]\\b|\\bS_\\{?[345]\\b|\\b[DQ]_\\{?[3-9]\\b|M_\\{?2[2-4]\\b");

    private final LatexDocument document;
    private final Directives directives;
    private final Optional<Resolution> defaultGroup;
    private final List<GroupName> mentions;
    private final SymplecticUsage usage;
    private final Map<Span, Boolean> otherMatters = new HashMap<>();

    Settings(LatexDocument document, Directives directives, Optional<Resolution> defaultGroup) {
        this.document = document;
        this.directives = directives;
        this.defaultGroup = defaultGroup;
        this.mentions = GroupReader.find(document.prose());
        this.usage = SymplecticUsage.of(mentions);
    }

    /** The groups a statement may be about, nearest first, each group once. */
    List<SettingCandidate> candidates(Span statement, Span passage) {
        Optional<Directive> directive = directives.setting(statement.start());
        if (directive.isPresent()) {
            return List.of(of(directive.get()));
        }
        List<Placed> placed = new ArrayList<>();
        Span paragraph = paragraph(statement);
        List<Heading> above = headingsAbove(statement.start());
        for (GroupName mention : mentions) {
            if (!mention.span().overlaps(statement)) {
                placed.add(new Placed(
                        mention,
                        nearness(mention.span(), statement, passage, paragraph, above),
                        distance(mention.span(), statement)));
            }
        }
        placed.sort(Comparator.comparing(Placed::near).thenComparingLong(Placed::distance));
        Map<String, SettingCandidate> candidates = new LinkedHashMap<>();
        placed.forEach(mention -> add(mention, candidates));
        if (candidates.isEmpty() && defaultGroup.isPresent()) {
            return List.of(new SettingCandidate(defaultGroup.get(), Nearness.DEFAULT, null, false));
        }
        return candidates.values().stream().limit(MOST).toList();
    }

    private record Placed(GroupName name, Nearness near, long distance) {}

    private static SettingCandidate of(Directive directive) {
        Resolution group = directive instanceof Directive.Group named
                ? named.group()
                : new Resolution.Unsupported(
                        ((Directive.Branching) directive).written(), "branching rules are not judged yet");
        return new SettingCandidate(group, Nearness.DIRECTIVE, directive.span(), false);
    }

    /** A simple group, by what the document's Sp(n) counts; products of groups are not judged yet. */
    private Resolution resolve(GroupName name) {
        Resolution full = Groups.resolveFully(name, usage);
        return full instanceof Resolution.Simple ? full : Groups.resolve(name);
    }

    private void add(Placed mention, Map<String, SettingCandidate> candidates) {
        Resolution whole = resolve(mention.name());
        candidates.putIfAbsent(
                whole.display(),
                new SettingCandidate(whole, mention.near(), mention.name().span(), false));
        if (mention.name().factors().size() > 1) {
            for (GroupName.Factor factor : mention.name().factors()) {
                Resolution part =
                        resolve(new GroupName(List.of(factor), mention.name().span()));
                if (part instanceof Resolution.Simple) {
                    candidates.putIfAbsent(
                            part.display(),
                            new SettingCandidate(
                                    part, mention.near(), mention.name().span(), true));
                }
            }
        }
    }

    /** Mentions before the statement count as twice as near as those behind it. */
    private static long distance(Span mention, Span statement) {
        return mention.start() < statement.start()
                ? statement.start() - (long) mention.end()
                : 2L * (mention.start() - (long) statement.end()) + 1;
    }

    private Nearness nearness(Span mention, Span statement, Span passage, Span paragraph, List<Heading> above) {
        if (passage.contains(mention) && !inLaterRow(statement, mention)) {
            return Nearness.PASSAGE;
        }
        if (passage.contains(mention)) {
            return Nearness.DOCUMENT;
        }
        if (paragraph.contains(mention)) {
            return Nearness.PARAGRAPH;
        }
        return above.stream().anyMatch(heading -> heading.span().contains(mention))
                ? Nearness.HEADING
                : Nearness.DOCUMENT;
    }

    /** What is announced in a later row of a display is about that row. */
    private boolean inLaterRow(Span statement, Span mention) {
        return mention.start() >= statement.end()
                && new Span(statement.end(), mention.start())
                        .of(document.source().content())
                        .contains("\\\\");
    }

    /**
     * Whether the paragraph, the one before it or a heading above speaks of finite groups, fusion, identical particles and the like, by which a statement that is
     * false in the Lie group named beside them may be true.
     */
    boolean speaksOfFiniteGroups(Span statement) {
        return otherMatters.computeIfAbsent(
                paragraph(statement),
                place -> speaksOfOtherMatters(place)
                        || before(place).filter(this::speaksOfOtherMatters).isPresent()
                        || headingsAbove(place.end()).stream()
                                .anyMatch(heading -> speaksOfOtherMatters(heading.span())));
    }

    private boolean speaksOfOtherMatters(Span place) {
        return OTHER_MATTERS.matcher(place.of(document.source().content())).find();
    }

    private Optional<Span> before(Span paragraph) {
        return document.paragraphs().stream()
                .filter(other -> other.end() <= paragraph.start())
                .reduce((first, last) -> last);
    }

    private Span paragraph(Span statement) {
        return document.paragraphs().stream()
                .filter(paragraph -> paragraph.start() <= statement.start() && statement.start() <= paragraph.end())
                .findFirst()
                .orElse(statement);
    }

    private List<Heading> headingsAbove(int offset) {
        List<Heading> above = new ArrayList<>();
        for (Heading heading : document.headings()) {
            if (heading.span().start() > offset) {
                break;
            }
            above.removeIf(outer -> outer.level() >= heading.level());
            above.add(heading);
        }
        return above;
    }
}
