using System.Runtime.InteropServices;
using Auditor.Reports.Files;

namespace Auditor.Cli;

/// <summary>Has whatever is unfinished removed when somebody stops the program, which then ends as it would have.</summary>
internal sealed class Interruption : IDisposable
{
    private static readonly PosixSignal[] Stops = [PosixSignal.SIGINT, PosixSignal.SIGTERM, PosixSignal.SIGHUP, PosixSignal.SIGQUIT];

    private readonly PosixSignalRegistration[] _registrations = [.. Stops.Select(stop => PosixSignalRegistration.Create(stop, _ => Leftovers.RemoveAll()))];

    public void Dispose() => Array.ForEach(_registrations, registration => registration.Dispose());
}
