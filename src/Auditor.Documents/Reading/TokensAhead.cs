using System.Collections.Concurrent;
using System.Runtime.ExceptionServices;
using YamlDotNet.Core;
using YamlDotNet.Core.Tokens;

namespace Auditor.Documents;

/// <summary>
/// Gives the tokens of a long text, which another thread finds meanwhile. Whoever takes them meets the same tokens, and the same fault
/// after the same token, as if it had looked for them itself.
/// </summary>
internal sealed class TokensAhead : IScanner, IDisposable
{
    private const int BatchSize = 1024;

    /// <summary>The thread that looks for tokens waits when so many batches have not been taken.</summary>
    private const int MostBatches = 8;

    private readonly BlockingCollection<Found[]> _batches = new(MostBatches);
    private readonly CancellationTokenSource _stop = new();
    private readonly Thread _thread;
    private Found[] _batch = [];
    private int _next;
    private ExceptionDispatchInfo? _fault;

    /// <summary>Begins to look for the tokens of a text.</summary>
    public TokensAhead(string text)
    {
        _thread = new Thread(() => Look(new Scanner(new StringReader(text), skipComments: true))) { IsBackground = true };
        _thread.Start();
    }

    /// <inheritdoc/>
    public Mark CurrentPosition { get; private set; }

    /// <inheritdoc/>
    public Token? Current { get; private set; }

    /// <inheritdoc/>
    public bool MoveNext() => MoveNextWithoutConsuming();

    /// <inheritdoc/>
    public bool MoveNextWithoutConsuming()
    {
        if (_next == _batch.Length)
        {
            if (!_batches.TryTake(out var batch, Timeout.Infinite))
            {
                Current = null;
                _fault?.Throw();
                return false;
            }

            (_batch, _next) = (batch, 0);
        }

        (Current, CurrentPosition) = _batch[_next++];
        return true;
    }

    /// <inheritdoc/>
    public void ConsumeCurrent() => Current = null;

    /// <summary>Stops to look for tokens.</summary>
    public void Dispose()
    {
        _stop.Cancel();
        _thread.Join();
        _batches.Dispose();
        _stop.Dispose();
    }

    private void Look(Scanner scanner)
    {
        try
        {
            for (var batch = Batch(scanner); batch.Length > 0; batch = Batch(scanner))
            {
                _batches.Add(batch, _stop.Token);
            }

            _batches.CompleteAdding();
        }
        catch (OperationCanceledException)
        {
            // Nobody takes tokens any more.
        }
    }

    /// <summary>The next tokens; those before a fault, which is kept for whoever wants more; none at the end.</summary>
    private Found[] Batch(Scanner scanner)
    {
        var batch = new List<Found>(BatchSize);
        try
        {
            while (batch.Count < BatchSize && _fault is null && scanner.MoveNext())
            {
                batch.Add(new Found(scanner.Current!, scanner.CurrentPosition));
            }
        }
        catch (Exception fault)
        {
            _fault = ExceptionDispatchInfo.Capture(fault);
        }

        return [.. batch];
    }

    private readonly record struct Found(Token Token, Mark Position);
}
