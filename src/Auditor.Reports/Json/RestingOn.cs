using Auditor.Engine.Evaluation;
using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;

namespace Auditor.Reports.Json;

/// <summary>What each finding of an audit rests on, as numbers in one list of foundations.</summary>
internal sealed class RestingOn
{
    private readonly Numbering<Foundation> _numbers = new();
    private readonly IReadOnlyList<int>[] _ofFinding;

    /// <summary>Finds it out.</summary>
    /// <param name="result">The audit.</param>
    /// <param name="partSize">How many findings one thread takes at a stretch.</param>
    public RestingOn(AuditResult result, int partSize)
    {
        var parts = InParts.Make(result.Findings.Count, partSize, range =>
        {
            var foundations = new Foundations(result);
            return Enumerable.Range(range.Start.Value, range.End.Value - range.Start.Value).Select(number => foundations.Of(result.Findings[number])).ToArray();
        });

        // Findings that rest on the same things have the same list of them.
        var known = new Dictionary<IReadOnlyList<Foundation>, IReadOnlyList<int>>(ReferenceEqualityComparer.Instance);
        _ofFinding = [.. parts.SelectMany(part => part).Select(list =>
        {
            if (!known.TryGetValue(list, out var numbers))
            {
                known.Add(list, numbers = [.. list.Select(_numbers.Of)]);
            }

            return numbers;
        })];
    }

    /// <summary>The foundations, in the order in which findings name them.</summary>
    public IReadOnlyList<Foundation> Foundations => _numbers.All;

    /// <summary>What a finding rests on.</summary>
    /// <param name="finding">Its place among the findings.</param>
    public IReadOnlyList<int> Of(int finding) => _ofFinding[finding];
}
