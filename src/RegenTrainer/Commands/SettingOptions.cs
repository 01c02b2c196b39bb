using System.CommandLine;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Session;

namespace RegenTrainer.Commands;

/// <summary>The options that say where the builder's hands are.</summary>
internal sealed class SettingOptions
{
    /// <summary>Travel in % where none is asked for: the middle.</summary>
    private const double DefaultTravelPercent = 50;

    private const double LowestHz = 1e3;
    private const double HighestHz = 1e9;

    private static readonly Dictionary<string, Grade> _grades =
        new() { ["weak"] = Grade.Weak, ["typical"] = Grade.Typical, ["strong"] = Grade.Strong };

    private readonly Option<double?> _dial = Options.Quantity(
        "--dial", Unit.Hertz, LowestHz, HighestHz, "HZ", "Dial, e.g. 999k. Default: the middle of the band, on the raster.");

    private readonly Option<double?> _capacitor = Options.Quantity(
        "--capacitor", Unit.Farad, 1e-15, 1e-3, "FARAD", "Tuning capacitor in place of a dial, e.g. 143p; locks the dial.");

    private readonly Option<bool> _locked = new("--locked")
    {
        Description = "The capacitor stays as it tunes at the idle stop. Default: it follows, so that the tank stays at the dial.",
    };

    private readonly Option<double?> _station = Options.Quantity(
        "--station", Unit.Hertz, LowestHz, HighestHz, "HZ", "Station on the air, e.g. 1008k. Default: at the dial.");

    private readonly Option<double?> _travel = Options.Quantity(
        "--travel", Unit.Percent, 0, 100, "PERCENT", "Travel of the regeneration control, 0 to 100. Default: 50.");

    private readonly Option<double?> _supply = Options.Quantity(
        "--supply", Unit.Volt, 0, 1000, "VOLT", "Supply, e.g. 2.4. Default: the stage's own.");

    private readonly Option<double?> _temperature = Options.Quantity(
        "--temperature", Unit.Celsius, -40, 85, "CELSIUS", "Temperature of everything, -40 to 85. Default: 20.");

    private readonly Option<string?> _device = new("--device")
    {
        HelpName = "NAME",
        Description = "Type in the regenerating socket, of the same polarity. Default: the stage's own.",
        CompletionSources = { DeviceShelf.Shipped.Names.ToArray() },
    };

    private readonly Option<Grade?> _grade = Options.Choice(
        "--grade", _grades, "Device of its type in the regenerating socket. Default: typical.");

    private readonly Option<double[]?> _audio = Options.Quantities(
        "--audio", Unit.Hertz, 1, 20e3, 64, "HZ,HZ...", "Audio frequencies of the sidebands. Default: 400,1000,3000.");

    /// <summary>Gives a command all options of a setting.</summary>
    public void AddTo(Command command)
    {
        foreach (Option option in (Option[])[_dial, _capacitor, _locked, _station, _travel, _supply, _temperature, _device, _grade])
        {
            command.Options.Add(option);
        }
    }

    /// <summary>Gives a command the options of a setting that hold along a whole dial.</summary>
    public void AddAlongDialTo(Command command)
    {
        foreach (Option option in (Option[])[_locked, _station, _travel, _supply, _temperature, _device, _grade])
        {
            command.Options.Add(option);
        }
    }

    /// <summary>Gives a command the option of the audio frequencies.</summary>
    public void AddAudioTo(Command command) => command.Options.Add(_audio);

    /// <summary>The audio frequencies asked for, in Hz.</summary>
    public IReadOnlyList<double> AudioHz(ParseResult line) => line.GetValue(_audio) is { Length: > 0 } asked ? asked : StageReader.DefaultAudioHz;

    /// <summary>The station asked for, in Hz; null where it stands at the dial.</summary>
    public double? StationHz(ParseResult line) => line.GetValue(_station);

    /// <summary>The setting asked for.</summary>
    /// <exception cref="StopException">The options do not fit each other or the stage.</exception>
    public Setting Read(ParseResult line, OpenedStage stage)
    {
        double? farad = line.GetValue(_capacitor), dial = line.GetValue(_dial), supply = line.GetValue(_supply);
        if (farad is not null && dial is not null)
        {
            throw Misfit("--capacitor: found --dial beside it, expected one of the two");
        }

        if (supply is not null && stage.Model.Circuit.SupplyVolt is null)
        {
            throw Misfit("--supply: this stage has no supply");
        }

        bool locked = line.GetValue(_locked) || farad is not null;
        return new Setting(dial ?? MiddleOfBandHz(stage.Model.Circuit.Dial), line.GetValue(_travel) ?? DefaultTravelPercent)
        {
            StationHz = line.GetValue(_station),
            SupplyVolt = supply,
            TemperatureCelsius = line.GetValue(_temperature) ?? 20,
            Grade = line.GetValue(_grade) ?? Grade.Typical,
            DialMode = locked ? DialMode.Locked : DialMode.Follows,
            LockedFarad = farad,
            Device = line.GetValue(_device) is { } name ? Device(name, stage) : null,
        };
    }

    /// <summary>The dial where none is asked for, in Hz.</summary>
    public static double MiddleOfBandHz(Dial dial) => Steps.MiddleOfBand(dial);

    private static BipolarModel Device(string name, OpenedStage stage)
    {
        string shown = Options.Shown(name);
        Polarity polarity = stage.RegeneratingPolarity ?? throw Misfit("--device: this stage has no device in a regenerating socket");
        DeviceModel found = stage.FindDevice(name);
        if (found is not BipolarModel device)
        {
            throw Misfit($"--device: found \"{shown}\", {DeviceModel.Phrase(found.Kind)}, expected {Word(polarity)} as the stage's own device");
        }

        return device.Polarity == polarity
            ? device
            : throw Misfit($"--device: found \"{shown}\", {Word(device.Polarity)}, expected {Word(polarity)} as the stage's own device");
    }

    private static string Word(Polarity polarity) => polarity == Polarity.Npn ? "an NPN type" : "a PNP type";

    private static StopException Misfit(string line) => new(ExitCode.CommandLine, "regentrainer: " + line);
}
