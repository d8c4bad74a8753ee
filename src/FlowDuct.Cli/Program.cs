using FlowDuct.Cli.CommandLine;

using Stream stdout = Output.Standard(1);
using Stream stderr = Output.Standard(2);
return Application.Run(args, stdout, stderr, Output.IsTerminal(1), Output.StandardInput, Output.IsTerminal(2));
