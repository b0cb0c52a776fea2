namespace Auditor.Documents;

/// <summary>What a scalar is by the YAML 1.2 core schema.</summary>
public enum ScalarKind
{
    /// <summary>A text: whatever is quoted, and whatever is nothing else. <c>yes</c>, <c>no</c>, <c>.nan</c> and <c>.inf</c> are texts.</summary>
    Text,

    /// <summary>A finite number.</summary>
    Number,

    /// <summary><c>true</c> or <c>false</c>.</summary>
    Flag,

    /// <summary><c>null</c>, <c>~</c> or nothing at all.</summary>
    Null,
}
