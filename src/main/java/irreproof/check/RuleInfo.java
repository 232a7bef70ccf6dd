package irreproof.check;

/**
 * What a user can read about a rule.
 *
 * @param name as used after "allow"
 * @param severity the severity its findings usually have
 * @param summary one line without a full stop
 * @param page the rule's whole page, Markdown
 */
public record RuleInfo(String name, Severity severity, String summary, String page) {}
