namespace Auditor.Documents;

/// <summary>What a quick look at a value tells of whether a schema takes it.</summary>
internal enum Acceptance
{
    /// <summary>The schema takes it.</summary>
    Yes,

    /// <summary>The schema refuses it.</summary>
    No,

    /// <summary>Only the validator can tell.</summary>
    Unsure,
}
