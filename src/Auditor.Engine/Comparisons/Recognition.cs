namespace Auditor.Engine.Comparisons;

/// <summary>By what two subjects of two revisions were recognised as one.</summary>
public enum Recognition
{
    /// <summary>The same key: the same id on the same board.</summary>
    Key,

    /// <summary>The later design names the earlier key under <c>formerly</c>.</summary>
    Declared,

    /// <summary>The same name and the same stated inputs, which no other subject has.</summary>
    Content,

    /// <summary>The same name, which no other subject of its kind has in either revision.</summary>
    Name,
}
