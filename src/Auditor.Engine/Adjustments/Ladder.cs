using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Adjustments;

/// <summary>The values that an adjustable input may take.</summary>
public abstract record Ladder
{
    private protected Ladder()
    {
    }

    /// <summary>The values at a subject, in their order; null where every value between two bounds may be taken.</summary>
    public abstract IReadOnlyList<Value>? StepsAt(ISubject subject);
}
