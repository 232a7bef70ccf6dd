package irreproof.check.judge;

import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.WeylDimension;
import irreproof.naming.LieGroup;
import irreproof.notation.Expression.NumberName;
import java.util.List;
import java.util.Optional;

/** Names whose meaning the author declared in a directive. */
public record DeclaredNames(List<Declaration> declarations) {
    public static final DeclaredNames NONE = new DeclaredNames(List.of());

    public DeclaredNames {
        declarations = List.copyOf(declarations);
    }

    /**
     * @param name the name without bars: {@code 15'}
     * @param irrep its Dynkin labels in Bourbaki order
     */
    public record Declaration(String name, DominantWeight irrep) {}

    /** The irrep declared for the name without its bars; a declaration of the wrong rank or dimension does not count. */
    Optional<DominantWeight> meaning(NumberName name, LieGroup group) {
        String written = name.numerator()
                + "'".repeat(name.decoration().primes())
                + name.decoration().label();
        return declarations.stream()
                .filter(declaration -> declaration.name().equals(written))
                .map(Declaration::irrep)
                .filter(irrep -> irrep.rank() == group.algebra().rank())
                .filter(irrep -> WeylDimension.dimension(group.algebra(), irrep).equals(name.numerator()))
                .reduce((first, last) -> last);
    }
}
