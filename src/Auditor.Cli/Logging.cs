using Serilog;
using Serilog.Core;
using Serilog.Events;

namespace Auditor.Cli;

/// <summary>Diagnostics of the program itself, on standard error; findings never go here.</summary>
internal static class Logging
{
    /// <summary>Starts logging.</summary>
    /// <param name="verbose">Whether to tell each step; otherwise only warnings.</param>
    public static Logger Start(bool verbose)
    {
        var logger = new LoggerConfiguration()
            .MinimumLevel.Is(verbose ? LogEventLevel.Debug : LogEventLevel.Warning)
            .WriteTo.Console(outputTemplate: "{Level:u3} {Message:lj}{NewLine}{Exception}", standardErrorFromLevel: LogEventLevel.Verbose)
            .CreateLogger();
        Log.Logger = logger;
        return logger;
    }
}
