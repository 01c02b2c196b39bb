using System.CommandLine;
using RegenTrainer.Files;

namespace RegenTrainer.Commands;

/// <summary>What every command works with.</summary>
/// <param name="Output">Where results and messages go.</param>
/// <param name="ProgressTo">The terminal that progress is shown on; null where messages go elsewhere.</param>
internal sealed record CommandContext(Output Output, TextWriter? ProgressTo)
{
    /// <summary>The option that asks for JSON; one instance serves all commands.</summary>
    public Option<bool> Json { get; } = new("--json") { Description = "The answer as JSON." };

    /// <summary>The argument that names a stage.</summary>
    public static Argument<string> StageArgument()
    {
        var stage = new Argument<string>("STAGE") { Description = "A stage file's path or a preset's name." };
        stage.CompletionSources.Add([.. Presets.Names]);
        return stage;
    }

    /// <summary>Hands over an answer in the form asked for.</summary>
    public void Answer(ParseResult line, Func<byte[]> json, Func<string> text)
    {
        if (line.GetValue(Json))
        {
            Output.Result(json());
        }
        else
        {
            Output.Result(text());
        }
    }

    /// <summary>The commands of the program, in the order of the help.</summary>
    public IEnumerable<Command> Commands() =>
    [
        ReadingCommand.Create(this),
        DialCommand.Create(this),
        SidebandsCommand.Create(this),
        BiasCommand.Create(this),
        CoilCommand.Create(this),
        CheckCommand.Create(this),
        PresetsCommand.Create(this),
        CompletionsCommand.Create(this),
    ];
}
