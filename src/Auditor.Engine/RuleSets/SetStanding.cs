namespace Auditor.Engine.RuleSets;

/// <summary>What a set is to those that it is built on.</summary>
internal enum SetStanding
{
    /// <summary>It comes with the program.</summary>
    Shipped,

    /// <summary>
    /// It stands on its own, or belongs to a whole of sets in one folder <c>sets</c> that is built on nothing shipped, such as a copy of
    /// the rule data.
    /// </summary>
    Own,

    /// <summary>A firm builds it on another set; whatever it changes there is told.</summary>
    House,
}
