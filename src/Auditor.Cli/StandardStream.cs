using System.Globalization;
using System.Text;

namespace Auditor.Cli;

/// <summary>A standard stream of the process, which may be closed or lead to a full disk.</summary>
/// <param name="inner">The stream.</param>
/// <param name="isDispensable">Whether the work goes on when it cannot be written; otherwise that throws a <see cref="LostOutputException"/>.</param>
internal sealed class StandardStream(TextWriter inner, bool isDispensable) : TextWriter(CultureInfo.InvariantCulture)
{
    public override Encoding Encoding => inner.Encoding;

    public override void Write(char value) => Try(() => inner.Write(value));

    public override void Write(char[] buffer, int index, int count) => Try(() => inner.Write(buffer, index, count));

    public override void Write(string? value) => Try(() => inner.Write(value));

    public override void WriteLine(string? value) => Try(() => inner.WriteLine(value));

    public override void Flush() => Try(inner.Flush);

    private void Try(Action write)
    {
        try
        {
            write();
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            if (!isDispensable)
            {
                throw new LostOutputException((fault.InnerException ?? fault).Message);
            }
        }
    }
}
