namespace Auditor.Hostile.Tests.Cases;

/// <summary>Formulas of a rule set that came from somebody else.</summary>
internal static class FormulaCases
{
    public static IReadOnlyList<HostileCase> All { get; } =
    [
        Firm.Formula("formula-sound", "1 + 1"),
        Firm.Formula("formula-brackets-deep", new string('(', 900) + "1" + new string(')', 900)),
        Firm.Formula("formula-chain-deep", "1" + Site.Times(400, " - 1")),
        Firm.Formula("formula-signs-deep", new string('-', 1500) + "1"),
        Firm.Formula("formula-long", "1 + " + new string(' ', 2000) + "1"),
        Firm.Formula("formula-powers", "(((9 ^ 9) ^ 9) ^ 9) ^ 9"),
        Firm.Formula("formula-division-by-zero", "1 / 0"),
        Firm.Formula("formula-zero-by-zero", "0 / 0"),
        Firm.Formula("formula-overflow", "1e300 * 1e300"),
        Firm.Formula("formula-overflow-taken-back", "1e300 * 1e300 - 1e300 * 1e300"),
        Firm.Formula("formula-root-of-negative", "sqrt(0 - 1)"),
        Firm.Formula("formula-number-too-large", "1e999"),
        Firm.Formula("formula-pattern-that-backtracks", "choose(matches(name ?? '" + new string('a', 500) + "', '(a|a)*(a|aa)+b'), 1, 2)"),
        Firm.Formula("formula-pattern-that-looks-around", "choose(matches(name, '(?=a)a'), 1, 2)"),
        Firm.Formula("formula-pattern-that-refers-back", "choose(matches(name, '(a)\\1'), 1, 2)"),
        Firm.Formula("formula-pattern-that-counts-far", "choose(matches(name, '((a{1,1000}){1,1000}){1,1000}'), 1, 2)"),
        Firm.Formula("formula-statement", "x = 1; x"),
        Firm.Formula("formula-loop", "while true; end"),
        Firm.Formula("formula-function", "func f; ret f; end; f"),
        Firm.Formula("formula-include", "include 'firm.yaml'"),
        Firm.Formula("formula-reads-object", "object.eval '1'"),
        Firm.Formula("formula-comment", "1 # rest"),
        Firm.Formula("formula-unknown-name", "System.IO.File"),
        Firm.Formula("formula-empty", " "),
    ];
}
