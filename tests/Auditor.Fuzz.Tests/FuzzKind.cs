using Auditor.Documents;
using Auditor.Formulas.Values;

namespace Auditor.Fuzz.Tests;

/// <summary>A kind of input: good ones to begin with, and the part of the program that judges bad ones.</summary>
internal abstract class FuzzKind : IDisposable
{
    /// <summary>The folder in which inputs are put that are read from a file.</summary>
    protected FuzzFolder Folder { get; } = new();

    /// <summary>Good inputs.</summary>
    public abstract IReadOnlyList<byte[]> Seeds { get; }

    /// <summary>Has the program deal with an input.</summary>
    public abstract Judgement Judge(byte[] input);

    public void Dispose() => Folder.Dispose();

    /// <summary>A result goes with no error, and no result with at least one that can be shown.</summary>
    protected static Judgement Judged(bool hasResult, Problems problems) =>
        hasResult != problems.HasErrors && (hasResult || ProblemText.Render(problems.All).Length > 0)
            ? hasResult ? Judgement.Taken : Judgement.Refused
            : Judgement.Neither;

    /// <summary>Whether a value is a finite number, something other than a number, or missing for a reason.</summary>
    protected static bool IsWhole(Value value) => value.Kind switch
    {
        ValueKind.Missing => value.Absences.Items.Count > 0,
        ValueKind.Quantity => double.IsFinite(value.Number),
        _ => true,
    };
}
