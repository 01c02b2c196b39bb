using System.CommandLine;
using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;
using RegenTrainer.Files.Reports;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer sidebands STAGE</c>: what the selectivity leaves of a programme, and of its neighbours.</summary>
internal static class SidebandsCommand
{
    private const double SpanHz = 20e3;

    private const int Points = 81;

    public static Command Create(CommandContext context)
    {
        var stage = CommandContext.StageArgument();
        var setting = new SettingOptions();
        var command = new Command("sidebands", "How each audio frequency fares, the neighbour channels, the response within 20 kHz.");
        command.Arguments.Add(stage);
        setting.AddTo(command);
        setting.AddAudioTo(command);
        command.Options.Add(context.Json);
        command.SetAction(line =>
        {
            OpenedStage opened = OpenedStage.Open(line.GetRequiredValue(stage));
            var workspace = new StageWorkspace(opened.Model);
            Setting asked = setting.Read(line, opened);
            Reading reading = StageReader.Read(workspace, asked, setting.AudioHz(line));
            Interaction interaction = InteractionReader.Read(workspace, asked, setting.AudioHz(line));
            IReadOnlyList<Neighbour> neighbours = StageReader.Neighbours(workspace, asked);
            IReadOnlyList<ResponsePoint> response = StageReader.Response(workspace, asked, Around(reading.Setting.StationHz));
            context.Answer(
                line,
                () => SidebandsJson.Write(opened.Title, reading, interaction, neighbours, response),
                () => SidebandsText.Of(opened.Title, reading, interaction, neighbours, response));
            return ExitCode.Done;
        });
        return command;
    }

    /// <summary>Frequencies in Hz around a station, from 20 kHz below to 20 kHz above; those that are not above 0 left out.</summary>
    private static double[] Around(double stationHz) =>
        [.. Enumerable.Range(0, Points).Select(k => stationHz - SpanHz + (k * 2 * SpanHz / (Points - 1))).Where(hz => hz > 0)];
}
