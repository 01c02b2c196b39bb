using System.CommandLine;
using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Readings;
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
        var command = new Command("bias", "The operating point: currents, voltages, dissipation of every device, and every node.");
        command.Arguments.Add(stage);
        setting.AddTo(command);
        command.Options.Add(context.Json);
        command.SetAction(line =>
        {
            OpenedStage opened = OpenedStage.Open(line.GetRequiredValue(stage));
            BiasReading bias = BiasReader.Read(new StageWorkspace(opened.Model), setting.Read(line, opened));
            context.Answer(line, () => BiasJson.Write(opened.Title, bias), () => BiasText.Of(opened.Title, bias));
            return ExitCode.Done;
        });
        return command;
    }
}
