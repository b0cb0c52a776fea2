using System.Runtime.ExceptionServices;

namespace Auditor.Engine.Evaluation;

/// <summary>Does a long job in parts, side by side on the processors of the machine. What comes out does not depend on how many there are.</summary>
public static class InParts
{
    /// <summary>As much as the first thread of a program usually has at least, so that it does not matter on which thread a formula is evaluated.</summary>
    private const int StackSize = 16 << 20;

    /// <summary>Makes the parts, in their order.</summary>
    /// <typeparam name="T">What a part is.</typeparam>
    /// <param name="count">How many things there are.</param>
    /// <param name="size">How many things make a part; where there are no more, the caller's own thread does it.</param>
    /// <param name="make">Makes a part from the things of a range, which has its end within <paramref name="count"/>.</param>
    public static T[] Make<T>(int count, int size, Func<Range, T> make)
    {
        var parts = new T[(count + size - 1) / size];
        if (parts.Length <= 1)
        {
            return count == 0 ? [] : [make(..count)];
        }

        var next = -1;
        ExceptionDispatchInfo? fault = null;
        var threads = Enumerable.Range(0, Math.Min(Environment.ProcessorCount, parts.Length)).Select(_ => new Thread(Work, StackSize)).ToArray();
        Array.ForEach(threads, thread => thread.Start());
        Array.ForEach(threads, thread => thread.Join());
        fault?.Throw();
        return parts;

        void Work()
        {
            try
            {
                for (var part = Interlocked.Increment(ref next); part < parts.Length; part = Interlocked.Increment(ref next))
                {
                    parts[part] = make((part * size)..Math.Min((part + 1) * size, count));
                }
            }
            catch (Exception caught)
            {
                fault = ExceptionDispatchInfo.Capture(caught);
                next = parts.Length;
            }
        }
    }
}
