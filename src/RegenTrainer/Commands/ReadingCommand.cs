using System.CommandLine;
using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Tuning;
using RegenTrainer.Files.Reports;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer reading STAGE</c>: everything computed for one setting.</summary>
internal static class ReadingCommand
{
    public static Command Create(CommandContext context)
    {
        var stage = CommandContext.StageArgument();
        var setting = new SettingOptions();
        var command = new Command("reading", "The stage at one setting: Q, bandwidth, tip-over, margin, sidebands, stray modes.");
        command.Arguments.Add(stage);
        setting.AddTo(command);
        setting.AddAudioTo(command);
        command.Options.Add(context.Json);
        command.SetAction(line =>
        {
            OpenedStage opened = OpenedStage.Open(line.GetRequiredValue(stage));
            Reading reading = StageReader.Read(new StageWorkspace(opened.Model), setting.Read(line, opened), setting.AudioHz(line));
            context.Answer(line, () => ReadingJson.Write(opened.Title, reading), () => ReadingText.Of(opened.Title, reading));
            return ExitCode.Done;
        });
        return command;
    }
}
