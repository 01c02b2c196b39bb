using System.CommandLine;
using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;
using RegenTrainer.Files.Reports;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer bias STAGE</c>: the operating point.</summary>
internal static class BiasCommand
{
    public static Command Create(CommandContext context)
    {
        var stage = CommandContext.StageArgument();
        var setting = new SettingOptions();
        var command = new Command("bias", "The operating point of every device, how far it can be driven, what the supply gives and how the stage drifts.");
        command.Arguments.Add(stage);
        setting.AddTo(command);
        command.Options.Add(context.Json);
        command.SetAction(line =>
        {
            OpenedStage opened = OpenedStage.Open(line.GetRequiredValue(stage));
            var workspace = new StageWorkspace(opened.Model);
            Setting asked = setting.Read(line, opened);
            BiasReading bias = BiasReader.Read(workspace, asked);
            HeadroomReading headroom = HeadroomReader.Read(workspace, asked);
            context.Answer(
                line, () => BiasJson.Write(opened.Title, bias, headroom), () => BiasText.Of(opened.Title, bias, headroom));
            return ExitCode.Done;
        });
        return command;
    }
}
