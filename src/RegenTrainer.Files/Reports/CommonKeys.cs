using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;

namespace RegenTrainer.Files.Reports;

/// <summary>Keys that several answers share, written by one hand so that they read the same everywhere.</summary>
internal static class CommonKeys
{
    /// <summary>The suffix of a controlled element: its unit, or <c>factor</c> where it has none.</summary>
    public static string ControlSuffix(Unit unit) => unit == Unit.None ? "factor" : "ohm";

    public static string? Word(TipOverState? state) => state switch
    {
        TipOverState.Never => "never",
        TipOverState.Always => "always",
        TipOverState.Once => "once",
        TipOverState.Several => "several",
        _ => null,
    };

    public static string? Word(Regime? regime) => regime switch
    {
        Regime.Damped => "damped",
        Regime.Idle => "idle",
        Regime.Working => "working",
        Regime.Edge => "edge",
        Regime.Oscillating => "oscillating",
        _ => null,
    };

    public static void AudioDown(FigureWriter writer, Reading reading)
    {
        writer.Number("audio_3db_hz", reading.AudioDownHz.Db3);
        writer.Number("audio_6db_hz", reading.AudioDownHz.Db6);
        writer.Number("audio_10db_hz", reading.AudioDownHz.Db10);
    }

    public static void Sidebands(FigureWriter writer, Reading reading) =>
        writer.List("sidebands", reading.Sidebands, (w, band) =>
        {
            w.Number("audio_hz", band.AudioHz);
            w.Number("upper_db", band.UpperDb);
            w.Number("lower_db", band.LowerDb);
            w.Number("audio_db", band.AudioDb);
        });

    public static void Neighbours(FigureWriter writer, IReadOnlyList<Neighbour> neighbours) =>
        writer.List("neighbours", neighbours, (w, neighbour) =>
        {
            w.Number("offset_hz", neighbour.OffsetHz);
            w.Number("relative_db", neighbour.RelativeDb);
        });
}
