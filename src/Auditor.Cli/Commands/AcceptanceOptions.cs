using System.CommandLine;
using Auditor.Documents;
using Auditor.Engine.Guarded;

namespace Auditor.Cli.Commands;

/// <summary>The options that say what to do with tolerances.</summary>
internal sealed class AcceptanceOptions
{
    private const int MostSamples = 1_000_000;

    private readonly Option<Decision?> _decision = MakeDecision();

    private readonly Option<int> _samples = new("--sample")
    {
        Description = "Also draw so many designs at random from within the tolerances, and tell in how many each rule is kept.",
        HelpName = "N",
    };

    private readonly Option<int> _seed = new("--seed") { Description = "Where the random numbers of --sample begin.", HelpName = "N", DefaultValueFactory = _ => 1 };

    /// <summary>The option that names the decision rule.</summary>
    public static Option<Decision?> MakeDecision() => new("--decision")
    {
        Description = "Hold values against limits as stated (simple), or wherever within the tolerances the true inputs lie (guarded); " +
            "the design decides when left out.",
    };

    /// <summary>Adds the options to a command.</summary>
    public void AddTo(Command command)
    {
        command.Options.Add(_decision);
        command.Options.Add(_samples);
        command.Options.Add(_seed);
    }

    /// <summary>What the caller asks for.</summary>
    public Acceptance Read(ParseResult parsed, Problems problems)
    {
        var samples = parsed.GetValue(_samples);
        if (samples is < 0 or > MostSamples)
        {
            problems.Add(CommandMessages.NotSamples(samples, MostSamples));
        }

        return new Acceptance(parsed.GetValue(_decision), samples, parsed.GetValue(_seed));
    }
}
