using System.CommandLine;
using System.Reflection;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer completions bash</c>: the script that lets a shell complete commands, options and presets.</summary>
internal static class CompletionsCommand
{
    private const string Bash = "bash";

    public static Command Create(CommandContext context)
    {
        var shell = new Argument<string>("SHELL") { Description = "The shell: bash.", DefaultValueFactory = _ => Bash };
        shell.AcceptOnlyFromAmong(Bash);
        var command = new Command("completions", "The script for a shell's completions: source <(regentrainer completions bash)");
        command.Arguments.Add(shell);
        command.SetAction(_ =>
        {
            context.Output.Result(Script());
            return ExitCode.Done;
        });
        return command;
    }

    private static string Script()
    {
        using Stream script = Assembly.GetExecutingAssembly().GetManifestResourceStream("regentrainer.bash")
            ?? throw new InvalidOperationException("the script is not in the program");
        using var reader = new StreamReader(script);
        return reader.ReadToEnd();
    }
}
