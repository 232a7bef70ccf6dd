package irreproof.naming;

/** What a group's written name stands for. */
public sealed interface Resolution {
    /** The group as the author prints it. */
    String display();

    /** One simple Lie group. */
    record Simple(LieGroup group) implements Resolution {
        @Override
        public String display() {
            return group.display();
        }
    }

    /** A product of simple groups and U(1)s; only {@link Groups#resolveFully} finds these. */
    record Product(ProductGroup group) implements Resolution {
        @Override
        public String display() {
            return group.display();
        }
    }

    /** @param reason why statements about it stay undecided, as the user should read it */
    record Unsupported(String display, String reason) implements Resolution {}
}
