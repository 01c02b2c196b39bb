using System.CommandLine;
using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Files.Reports;

namespace RegenTrainer.Commands;

/// <summary><c>regentrainer coil</c>: a coil by itself, that of a stage or one described by options.</summary>
internal static class CoilCommand
{
    private const double DefaultHz = 1e6;

    public static Command Create(CommandContext context)
    {
        var stage = new Argument<string?>("STAGE")
        {
            Description = "A stage file's path or a preset's name; left out where the coil is described by options.",
            Arity = ArgumentArity.ZeroOrOne,
        };
        var geometry = new CoilOptions();
        Option<double?> at = Options.Quantity(
            "--at", Unit.Hertz, 1e3, 1e9, "HZ", "Frequency of loss and Q. Default: the middle of the stage's band, or 1M.");
        Option<double?> temperature = Options.Quantity(
            "--temperature", Unit.Celsius, -40, 85, "CELSIUS", "Temperature of the wire, -40 to 85. Default: 20.");
        var command = new Command("coil", "Inductance, Q, loss, self-capacitance and wire of a stage's coil, or of a described one.");
        command.Arguments.Add(stage);
        geometry.AddTo(command);
        command.Options.Add(at);
        command.Options.Add(temperature);
        command.Options.Add(context.Json);
        command.SetAction(line =>
        {
            double celsius = line.GetValue(temperature) ?? 20;
            if (line.GetValue(stage) is not { } name)
            {
                CoilReading described = CoilReader.Read("coil", geometry.Read(line), line.GetValue(at) ?? DefaultHz, celsius);
                context.Answer(line, () => CoilJson.Write(null, described), () => CoilText.Of("coil as described", described));
                return ExitCode.Done;
            }

            geometry.RefuseBeside(line, name);
            OpenedStage opened = OpenedStage.Open(name);
            double hz = line.GetValue(at) ?? SettingOptions.MiddleOfBandHz(opened.Model.Circuit.Dial);
            CoilReading coil = CoilReader.TryRead(opened.Model.Network.Parts, hz, celsius)
                ?? throw new StopException(ExitCode.Stage, $"{Printable.Text(name)}: found no coil, expected windings or an inductor");
            context.Answer(line, () => CoilJson.Write(opened.Title, coil), () => CoilText.Of(opened.Title, coil));
            return ExitCode.Done;
        });
        return command;
    }
}
