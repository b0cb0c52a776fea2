namespace Auditor.Formulas.Subjects;

/// <summary>Where a formula is being evaluated: the subject, the subject of the enclosing aggregate, and who records.</summary>
/// <param name="subject">Subject whose bare names are meant.</param>
/// <param name="outer">Scope reached by <c>this</c> inside an aggregate; null outside.</param>
/// <param name="trace">Who is told of every input, quantity, cell and reading; null when nobody asked.</param>
public sealed class Scope(ISubject subject, Scope? outer, ITrace? trace)
{
    /// <summary>Subject whose bare names are meant.</summary>
    public ISubject Subject { get; } = subject;

    /// <summary>Scope outside the aggregate.</summary>
    public Scope? Outer { get; } = outer;

    /// <summary>Who records, if anybody.</summary>
    public ITrace? Trace { get; } = trace;
}
