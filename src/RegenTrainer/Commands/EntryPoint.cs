using System.CommandLine;
using System.CommandLine.Parsing;
using System.Text;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Commands;

/// <summary>The program from its arguments to its exit code.</summary>
internal static class EntryPoint
{
    private const int MessageColumns = 300;

    /// <summary>Runs the program.</summary>
    /// <param name="args">The arguments.</param>
    /// <returns>One of <see cref="ExitCode"/>.</returns>
    public static int Run(string[] args)
    {
        if (OperatingSystem.IsWindows())
        {
            Console.OutputEncoding = Encoding.UTF8;
        }

        using Stream results = Console.OpenStandardOutput();
        using var messages = new StreamWriter(Console.OpenStandardError(), new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
        var output = new Output(results, messages);
        return Guarded(output, () => Run(args, new CommandContext(output, Console.IsErrorRedirected ? null : messages)));
    }

    /// <summary>Runs a body and turns whatever ends it early into lines on standard error and an exit code.</summary>
    internal static int Guarded(Output output, Func<int> body)
    {
        try
        {
            return body();
        }
        catch (StopException stop)
        {
            foreach (string line in stop.Lines)
            {
                output.Message(line);
            }

            return stop.ExitCode;
        }
        catch (Exception fault)
        {
            output.Message(FaultLog.Keep(fault));
            return ExitCode.Program;
        }
    }

    private static int Run(string[] args, CommandContext context)
    {
        Command[] commands = [.. context.Commands()];
        bool begins = args.Length > 0 && Array.Exists(commands, command => command.Name == args[0]);
        RootCommand root = OpenCommand.Create(context, alone: !begins);
        foreach (Command command in commands)
        {
            root.Subcommands.Add(command);
        }

        // A name that begins with @ is a file like any other.
        ParseResult line = root.Parse(args, new ParserConfiguration { ResponseFileTokenReplacer = null });
        if (line.Errors.Count > 0)
        {
            throw Refused(line.Errors[0].Message);
        }

        if (line.CommandResult.Command != root && Misplaced(line.RootCommandResult) is { } found)
        {
            throw Refused($"{Options.Shown(found)}: found before the command {line.CommandResult.Command.Name}, expected after it");
        }

        // The library's own text (help, version) goes through the same door as results.
        using var text = new StringWriter { NewLine = "\n" };
        int exitCode = line.Invoke(new InvocationConfiguration
        {
            EnableDefaultExceptionHandler = false,
            ProcessTerminationTimeout = null,
            Output = text,
            Error = text,
        });
        if (text.GetStringBuilder().Length > 0)
        {
            context.Output.Result(text.ToString());
        }

        return exitCode;
    }

    /// <summary>What stands before a command and would be passed over in silence; null where there is nothing.</summary>
    private static string? Misplaced(SymbolResult root) => ((CommandResult)root).Children
        .Where(child => child is OptionResult { Implicit: false } || (child is ArgumentResult && child.Tokens.Count > 0))
        .Select(child => child is OptionResult option ? option.Option.Name : child.Tokens[0].Value)
        .FirstOrDefault();

    private static StopException Refused(string message) =>
        new(ExitCode.CommandLine, "regentrainer: " + Printable.Fit(message, MessageColumns));
}
