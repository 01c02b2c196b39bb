using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Files.Reports;

/// <summary>The values in force as an answer states them; null where a value plays no part in it.</summary>
internal sealed record SettingKeys
{
    private SettingInForce? Setting { get; init; }

    private double? DialHz { get; init; }

    private double? StationHz { get; init; }

    private double? Celsius { get; init; }

    /// <summary>The setting of one reading.</summary>
    public static SettingKeys Of(SettingInForce setting) => new()
    {
        Setting = setting,
        DialHz = setting.DialHz,
        StationHz = setting.StationHz,
        Celsius = setting.TemperatureCelsius,
    };

    /// <summary>The setting of a run along the dial: every point has a dial of its own, and a station at it unless one is set.</summary>
    public static SettingKeys Along(SettingInForce setting, double? stationHz) =>
        Of(setting) with { DialHz = null, StationHz = stationHz };

    /// <summary>The setting of a part by itself.</summary>
    public static SettingKeys At(double celsius) => new() { Celsius = celsius };

    public void Write(FigureWriter writer)
    {
        writer.Number("dial_hz", DialHz);
        writer.Number("station_hz", StationHz);
        writer.Number("travel_percent", Setting?.TravelPercent);
        writer.Number("supply_volt", Setting?.SupplyVolt);
        writer.Number("temperature_celsius", Celsius);
        writer.Word("grade", Setting is { } s ? Word(s.Grade) : null);
        writer.Word("device", Setting?.Device);
        writer.Word("dial_mode", Setting is { } t ? Word(t.DialMode) : null);
    }

    private static string Word(Grade grade) => grade switch
    {
        Grade.Weak => "weak",
        Grade.Strong => "strong",
        _ => "typical",
    };

    private static string Word(DialMode mode) => mode == DialMode.Locked ? "locked" : "follows";
}
