package irreproof.check;

import irreproof.budget.Budget;
import irreproof.check.judge.DeclaredNames;
import irreproof.check.judge.LieLexicon;
import irreproof.check.judge.Names;
import irreproof.check.judge.Undecidable;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.Branching;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.latex.Reader;
import irreproof.naming.Groups;
import irreproof.naming.ProductGroup;
import irreproof.naming.Resolution;
import irreproof.naming.SymplecticUsage;
import irreproof.notation.AuthorStyle;
import irreproof.notation.GroupName;
import irreproof.notation.GroupReader;
import irreproof.notation.Statement;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * Completes a branching. Embeddings that give these irreps the same restriction, up to diagram automorphisms of the
 * factors and the signs of the charges, make one line; where there are several, a comment tells them apart by what the
 * defining irrep becomes.
 */
final class DerivedBranching {
    private static final Pattern ARROW =
            Pattern.compile("\\s*(?:->|→|⊃|>|\\\\(?:to|rightarrow|longrightarrow|supset|supseteq)(?![A-Za-z]))\\s*");

    private final String typed;
    private final Statement bare;
    private final DerivedNotation notation;
    private final Budget budget;

    DerivedBranching(String typed, Statement bare, DerivedNotation notation, Budget budget) {
        this.typed = typed;
        this.bare = bare;
        this.notation = notation;
        this.budget = budget;
    }

    /** True if groups are joined by arrows. */
    static boolean isChain(String setting) {
        return ARROW.matcher(setting).find();
    }

    Derivation.Result derive(String setting) {
        List<ProductGroup> groups = groups(setting);
        ProductGroup whole = groups.get(0);
        if (whole.parts().size() != 1 || whole.charges() > 0) {
            throw new Undecidable(
                    "the branching of the product group " + whole.display() + " is not derived; branch its factors");
        }
        ProductGroup last = groups.get(groups.size() - 1);
        List<Embedding> embeddings = EmbeddingChains.find(groups, budget);
        if (embeddings.isEmpty()) {
            throw new Undecidable("no embedding of " + last.display() + " in " + whole.display() + " is known here");
        }
        LieLexicon lexicon = new LieLexicon(whole.factors().get(0), DeclaredNames.NONE);
        Decomposition<DominantWeight> value = Derivation.judged(typed, bare, lexicon, whole.display(), budget)
                .values()
                .get(0);
        return new Derivation.Result(true, lines(value, embeddings, last));
    }

    private static List<ProductGroup> groups(String setting) {
        List<GroupName> names = new ArrayList<>();
        for (String part : ARROW.split(setting, -1)) {
            names.add(GroupReader.read(Reader.flatten(part))
                    .orElseThrow(() -> new Undecidable("\"" + part + "\" is not a group such as SU(5)")));
        }
        SymplecticUsage usage = SymplecticUsage.of(names);
        List<ProductGroup> groups = new ArrayList<>();
        for (GroupName name : names) {
            Resolution group = Groups.resolveFully(name, usage);
            if (group instanceof Resolution.Unsupported unsupported) {
                throw new Undecidable(unsupported.display() + ": " + unsupported.reason());
            }
            groups.add(
                    group instanceof Resolution.Simple simple
                            ? Derivation.alone(simple.group())
                            : ((Resolution.Product) group).group());
        }
        return groups;
    }

    private String lines(Decomposition<DominantWeight> value, List<Embedding> embeddings, ProductGroup group) {
        Map<Decomposition<ReductiveIrrep>, Embedding> results = new LinkedHashMap<>();
        Set<Decomposition<ReductiveIrrep>> seen = new HashSet<>();
        for (Embedding embedding : embeddings) {
            Decomposition<ReductiveIrrep> result = Branching.branch(embedding, value, budget);
            if (seen.add(result)) {
                seen.addAll(RestrictionImages.of(result, group.algebra()));
                results.put(result, embedding);
            }
        }
        DerivedNotation chosen = notation == DerivedNotation.AUTHOR
                ? DerivedNames.of(Names.of(bare.sides().get(0)).get(0))
                : notation;
        AuthorStyle style = DerivedNames.style(typed, bare, chosen);
        DerivedNames names = new DerivedNames(group, chosen, group.entries(), style, budget);
        DerivedNames plain =
                new DerivedNames(group, DerivedNotation.DIMENSION, group.entries(), AuthorStyle.standard(), budget);
        List<String> lines = new ArrayList<>();
        results.forEach((result, embedding) -> {
            List<String> remarks = new ArrayList<>();
            if (results.size() > 1) {
                Decomposition<ReductiveIrrep> smallest =
                        Branching.branch(embedding, EmbeddingChains.defining(embedding.algebra()), budget);
                remarks.add(embedding.name() + ", by " + plain.sum(smallest));
            }
            if (group.charges() > 0) {
                remarks.add("charges are coprime whole numbers, their signs a choice");
            }
            String comment = remarks.isEmpty() ? "" : " % " + String.join("; ", remarks);
            lines.add(bare.latex().strip() + " \\to " + names.sum(result) + comment);
        });
        return String.join("\n", lines);
    }
}
