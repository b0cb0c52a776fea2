namespace Auditor.Quantities;

/// <summary>How a stated quantity came to be known. A result that rests on an assumption is reported as such.</summary>
public enum Standing
{
    /// <summary>Chosen by the designer: what is to be built. Written without a word.</summary>
    Designed,

    /// <summary>Taken for want of better knowledge.</summary>
    Assumed,

    /// <summary>Given by somebody who answers for it, such as the network operator or a manufacturer.</summary>
    Declared,

    /// <summary>Read from an instrument on the finished installation.</summary>
    Measured,
}
