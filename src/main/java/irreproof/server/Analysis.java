package irreproof.server;

import irreproof.budget.Budget;
import irreproof.check.CheckOptions;
import irreproof.check.FileReport;
import irreproof.text.SourceText;

/** The function behind all features: {@link irreproof.check.Checker#check} but in tests that need a slow one. */
@FunctionalInterface
interface Analysis {
    FileReport check(SourceText source, CheckOptions options, Budget budget);
}
