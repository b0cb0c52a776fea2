using Auditor.Cli;

using var interruption = new Interruption();
Console.SetOut(new StandardStream(Console.Out, isDispensable: false));
Console.SetError(new StandardStream(Console.Error, isDispensable: true));
return AuditorProgram.Run(args, Console.Out, Console.Error);
