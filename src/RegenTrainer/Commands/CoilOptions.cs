using System.CommandLine;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Commands;

/// <summary>The options that describe a coil of one winding.</summary>
internal sealed class CoilOptions
{
    private readonly Option<double?> _form = Options.Quantity(
        "--form", Unit.Metre, 1e-4, 10, "METRE", "Outside diameter of the form, e.g. 50mm.");

    private readonly Option<double?> _wire = Options.Quantity(
        "--wire", Unit.Metre, 1e-6, 0.02, "METRE", "Diameter of the bare wire, e.g. 0.4mm or AWG 26.");

    private readonly Option<double?> _pitch = Options.Quantity(
        "--pitch", Unit.Metre, 1e-6, 1, "METRE", "Distance of neighbouring turns. Default: close wound, enamelled.");

    private readonly Option<double?> _turns = Options.Quantity(
        "--turns", Unit.None, 1, Winding.MostTurns, "TURNS", "Number of turns, whole.");

    private readonly Option<double[]?> _taps = Options.Quantities(
        "--taps", Unit.None, 1, Winding.MostTurns, Winding.MostTaps, "TURN,TURN...", "Taps as turns from the start, increasing.");

    /// <summary>Gives a command the options.</summary>
    public void AddTo(Command command)
    {
        foreach (Option option in All)
        {
            command.Options.Add(option);
        }
    }

    /// <summary>Refuses a described coil beside a named stage.</summary>
    /// <exception cref="StopException">An option is given.</exception>
    public void RefuseBeside(ParseResult line, string stage)
    {
        foreach (Option option in All)
        {
            if (line.GetResult(option) is not null)
            {
                throw Misfit($"{option.Name}: found the stage \"{Options.Shown(stage)}\" beside it, expected a stage or a described coil");
            }
        }
    }

    /// <summary>The coil described.</summary>
    /// <exception cref="StopException">A needed option is missing, or the values make no coil.</exception>
    public Coil Read(ParseResult line)
    {
        double form = Needed(line, _form), bare = Needed(line, _wire);
        int turns = Whole(_turns, Needed(line, _turns));
        int[] taps = [.. (line.GetValue(_taps) ?? []).Select(tap => Whole(_taps, tap))];
        var wire = new Wire(bare);
        double? pitch = line.GetValue(_pitch);
        if (pitch is { } distance && distance < wire.OverInsulationMetre)
        {
            throw Misfit(
                $"--pitch: found {QuantityText.Write(distance, Unit.Metre)}, expected at least "
                + $"{QuantityText.Write(wire.OverInsulationMetre, Unit.Metre)}, the wire with its insulation");
        }

        for (int k = 0; k < taps.Length; k++)
        {
            if (taps[k] >= turns || (k > 0 && taps[k] <= taps[k - 1]))
            {
                throw Misfit($"--taps: found {taps[k]}, expected turns from 1 to {turns - 1} in increasing order");
            }
        }

        return new Coil(Winding.OnForm(form, wire, turns, pitch, taps));
    }

    private Option[] All => [_form, _wire, _pitch, _turns, _taps];

    private static double Needed(ParseResult line, Option<double?> option) =>
        line.GetValue(option) ?? throw Misfit($"coil: expected a STAGE, or a coil by --form, --wire and --turns; {option.Name} is missing");

    private static int Whole(Option option, double value) =>
        value == Math.Floor(value)
            ? (int)value
            : throw Misfit($"{option.Name}: found {QuantityText.Write(value, Unit.None, 6)}, expected whole turns");

    private static StopException Misfit(string line) => new(ExitCode.CommandLine, "regentrainer: " + line);
}
