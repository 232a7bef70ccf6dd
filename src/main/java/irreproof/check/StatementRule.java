package irreproof.check;

import java.util.List;

/** One thing that can be wrong with one statement. Its page is the resource {@code irreproof/rules/NAME.md}. */
interface StatementRule {
    String name();

    Severity severity();

    List<Finding> examine(Case subject);
}
