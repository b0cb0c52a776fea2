namespace Auditor.Documents;

/// <summary>Reads a YAML file and puts what it includes in its place.</summary>
public static class DocumentLoader
{
    /// <summary>
    /// Reads a file. A key <c>include: relative/path.yaml</c> in any mapping stands for the keys of that file, whose own includes are
    /// relative to it. Included files lie in the folder of the top file or below it, whatever links lead where.
    /// </summary>
    /// <param name="fullPath">Where the file lies.</param>
    /// <param name="displayPath">The path to show: relative, with forward slashes.</param>
    /// <param name="problems">Receives whatever is wrong; never throws for a bad file.</param>
    /// <param name="limits">How much the document may ask of the reader; null for the default limits.</param>
    /// <param name="texts">Texts to take for what files hold, by display path; null for none.</param>
    /// <param name="onTop">Is shown the text of the top file before any of it is understood; null for nobody.</param>
    /// <returns>
    /// The document, or null when the top file could not be read. Where an included file could not be read, its keys are left out
    /// and the mapping is marked as partial.
    /// </returns>
    public static Document? Load(
        string fullPath, string displayPath, Problems problems, ReadingLimits? limits = null, IReadOnlyDictionary<string, string>? texts = null,
        Action<SourceText>? onTop = null)
    {
        var budget = new ReadingBudget(limits ?? ReadingLimits.Default);
        budget.TrySpendFile();
        if (SourceReader.Read(fullPath, displayPath, problems, budget, texts) is not { } top)
        {
            return null;
        }

        onTop?.Invoke(top.Text);
        var root = YamlReader.Read(top.Text, problems, budget, 0);
        return root is null ? null : new IncludeResolver(fullPath, displayPath, top, problems, budget, texts).Resolve(root);
    }
}
