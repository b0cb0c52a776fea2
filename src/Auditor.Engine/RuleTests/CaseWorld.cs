using Auditor.Engine.Evaluation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.RuleTests;

/// <summary>What the subjects of one case share: the parameters that it sets otherwise, and its installation.</summary>
internal sealed class CaseWorld(Evaluator evaluator, SubjectShape installation)
{
    private CaseSubject? _origin;

    public Evaluator Evaluator { get; } = evaluator;

    public Dictionary<int, Value> Parameters { get; } = [];

    public CaseSubject Origin => _origin ??= new CaseSubject(installation, "-", this);
}
