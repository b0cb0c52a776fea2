using YamlDotNet.Core;

namespace Auditor.Documents;

/// <summary>
/// Reads the part of YAML 1.2 that this project uses: mappings, sequences and scalars, in block and flow style. Anchors,
/// aliases, merge keys, directives, foreign tags and further documents are refused.
/// </summary>
public static class YamlReader
{
    /// <summary>Reads a text as one YAML document.</summary>
    /// <param name="source">The text.</param>
    /// <param name="problems">Receives whatever is wrong; never throws for a bad text.</param>
    /// <returns>
    /// The root value, or null when the text could not be read to its end. A value that was refused is left out, and the
    /// collection around it is marked as partial.
    /// </returns>
    public static Node? Read(SourceText source, Problems problems) => Read(source, problems, new ReadingBudget(ReadingLimits.Default), 0);

    internal static Node? Read(SourceText source, Problems problems, ReadingBudget budget, int nesting)
    {
        if (ForbiddenCharacters.Report(source, problems))
        {
            return null;
        }

        using var events = new YamlEvents(source);
        var builder = new TreeBuilder(events, source, problems, budget);
        try
        {
            return builder.ReadDocument(nesting);
        }
        catch (UnreadableException stopped)
        {
            problems.Add(stopped.Problem);
        }
        catch (YamlException fault)
        {
            problems.Add(SyntaxProblems.Word(source, fault, builder.OpenBracket));
        }
        catch (Exception fault) when (fault is InvalidOperationException or ArgumentException)
        {
            // The parser lets some malformed texts surface as these: an unfinished bracket, an escape that names no character.
            problems.Add(SyntaxProblems.Unplaced(source, events.Position, builder.OpenBracket));
        }

        return null;
    }
}
