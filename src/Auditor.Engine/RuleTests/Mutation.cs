using Auditor.Documents;

namespace Auditor.Engine.RuleTests;

/// <summary>One small change to a rule or to the formula of a quantity, made to see whether a case notices.</summary>
/// <param name="Owner">Rule id, or sheet, kind of subject and symbol.</param>
/// <param name="Span">What is changed, in the rule file.</param>
/// <param name="Change">The change in words.</param>
public sealed record Mutation(string Owner, SourceSpan Span, string Change)
{
    /// <summary>The mutation as a warning that no case noticed it.</summary>
    public Problem Unnoticed() => MutationMessages.Unnoticed(this);
}
