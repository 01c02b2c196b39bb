using System.CommandLine;
using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;
using RegenTrainer.Files.Reports;
using RegenTrainer.Session;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer dial STAGE</c>: tip-over, Q, bandwidth, gain and pull along the whole dial.</summary>
internal static class DialCommand
{
    /// <summary>More points than this nobody reads.</summary>
    private const int MostPoints = 2000;

    public static Command Create(CommandContext context)
    {
        var stage = CommandContext.StageArgument();
        var setting = new SettingOptions();
        var command = new Command("dial", "Tip-over, effective Q, bandwidth, gain and pull at every raster point of the dial.");
        command.Arguments.Add(stage);
        setting.AddAlongDialTo(command);
        command.Options.Add(context.Json);
        command.SetAction(line =>
        {
            OpenedStage opened = OpenedStage.Open(line.GetRequiredValue(stage));
            return Run(context, line, opened, setting.Read(line, opened), setting.StationHz(line));
        });
        return command;
    }

    private static int Run(CommandContext context, ParseResult line, OpenedStage opened, Setting asked, double? stationHz)
    {
        var workspace = new StageWorkspace(opened.Model);
        IReadOnlyList<double> raster = DialRaster.Points(opened.Model.Circuit.Dial, MostPoints, out int every);
        var cautions = new List<Caution>();
        if (every > 1)
        {
            cautions.Add(new Caution(
                "raster-thinned", $"the raster has over {MostPoints} points; each {every}. one and both ends are shown"));
        }

        var points = new List<DialPoint>(raster.Count);
        using var interruption = new Interruption();
        using (var progress = new Progress("dial points", context.ProgressTo))
        {
            foreach (double hz in raster)
            {
                if (interruption.Token.IsCancellationRequested)
                {
                    cautions.Add(new Caution("cut", $"stopped after {points.Count} of {raster.Count} dial points"));
                    break;
                }

                points.Add(DialRun.At(workspace, asked with { DialHz = hz }));
                progress.Report(points.Count, raster.Count);
            }
        }

        (double? LowHz, double? HighHz) reach = DialRun.Reach(workspace, asked);
        SettingInForce inForce = StageReader.Read(workspace, asked, []).Setting;
        context.Answer(
            line,
            () => DialJson.Write(opened.Title, inForce, stationHz, points, reach, cautions),
            () => DialText.Of(opened.Title, inForce, stationHz, points, reach, cautions));
        return interruption.ExitCode ?? ExitCode.Done;
    }
}
