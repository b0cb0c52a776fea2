namespace Auditor.Engine.Guarded;

/// <summary>How a value is held against its limit (JCGM 106).</summary>
public enum Decision
{
    /// <summary>The value as stated decides.</summary>
    Simple,

    /// <summary>The value must keep the limit wherever within the tolerances the true inputs lie.</summary>
    Guarded,
}
