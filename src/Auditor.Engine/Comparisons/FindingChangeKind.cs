namespace Auditor.Engine.Comparisons;

/// <summary>What became of a finding, what needs a reviewer first standing first.</summary>
public enum FindingChangeKind
{
    /// <summary>Nonconforming now, and not before.</summary>
    New,

    /// <summary>Nonconforming or departed as before, by a larger distance.</summary>
    Worse,

    /// <summary>It cannot be judged now; before, it could be, or there was nothing to judge.</summary>
    Undetermined,

    /// <summary>Nonconforming now and covered by a departure, and not before.</summary>
    Accepted,

    /// <summary>The verdict as before, but value, limit, provision, or what the verdict hangs on differ.</summary>
    Changed,

    /// <summary>It conforms as before, closer to the limit.</summary>
    Closer,

    /// <summary>It conformed, and the rule no longer applies to the subject.</summary>
    Ceased,

    /// <summary>Nonconforming or departed as before, by a smaller distance.</summary>
    Better,

    /// <summary>It could not be judged, and now conforms or no longer applies.</summary>
    Settled,

    /// <summary>It was nonconforming or departed, and now conforms or no longer applies.</summary>
    Gone,

    /// <summary>It conforms as before, further from the limit.</summary>
    Further,

    /// <summary>It conforms, and there was nothing to judge before; of an added subject, only where that hangs on an assumption.</summary>
    Started,

    /// <summary>As before.</summary>
    Unchanged,
}
