using Auditor.Cli;

return AuditorProgram.Run(args, Console.Out, Console.Error);
