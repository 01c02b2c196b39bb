using System.Globalization;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>Says where a coil leaves the range its tables and the lumped picture were made for.</summary>
internal static class CoilCautions
{
    private const double CautionTemperatureCelsius = 20.0;

    /// <summary>Frequency in Hz above which a winding should no longer be taken as lumped: a third of that at which its wire is half a wave (common practice).</summary>
    /// <param name="wireLengthMetre">Length of the wire in m.</param>
    public static double LumpedLimitHz(double wireLengthMetre) => PhysicalConstants.SpeedOfLight / (6.0 * wireLengthMetre);

    /// <summary>Collects the cautions of a coil at a frequency.</summary>
    /// <param name="windings">The windings of the coil.</param>
    /// <param name="hz">Frequency in Hz.</param>
    /// <param name="lossComputed">Whether the loss is computed; a measured Q does not rest on the table of Phi.</param>
    public static IReadOnlyList<Caution> Collect(IReadOnlyList<Winding> windings, double hz, bool lossComputed)
    {
        List<Caution> found = [];
        for (int index = 0; index < windings.Count; index++)
        {
            string name = windings.Count == 1 ? "The winding" : string.Create(CultureInfo.InvariantCulture, $"Winding {index + 1}");
            if (lossComputed)
            {
                AddLoss(found, windings[index], name, hz);
            }

            AddCapacitance(found, windings[index], name);
            AddLumped(found, windings[index], name, hz);
        }

        return found;
    }

    private static void AddLoss(List<Caution> found, Winding winding, string name, double hz)
    {
        if (winding.Turns > 1 && winding.Turns < MedhurstTables.FewestTurns)
        {
            found.Add(new Caution(
                "coil-few-turns",
                $"{name} has {winding.Turns} turns; its resistance rests on a table for {MedhurstTables.FewestTurns} turns or more and is likely too high."));
        }

        if (winding.Turns > 1 && winding.WireOverPitch < MedhurstTables.LeastWireOverPitch)
        {
            found.Add(new Caution(
                "coil-wide-pitch",
                $"{name} has a wire of {Say(winding.WireOverPitch)} times its pitch; the table begins at {Say(MedhurstTables.LeastWireOverPitch)}, its first value is used."));
        }

        double depths = 2.0 * WireLoss.RadiusOverSkinDepth(0.5 * winding.Wire.BareDiameterMetre, hz, CautionTemperatureCelsius);
        if (winding.Turns > 1 && depths < MedhurstTables.LeastWireOverSkinDepth)
        {
            found.Add(new Caution(
                "coil-thin-wire",
                $"{name} has a wire {Say(depths)} skin depths thick at {Say(hz / 1000.0)} kHz; the proximity loss was measured from {Say(MedhurstTables.LeastWireOverSkinDepth)} on."));
        }
    }

    private static void AddCapacitance(List<Caution> found, Winding winding, string name)
    {
        double length = winding.LengthOverDiameter;
        if (winding.Turns > 1
            && (length < MedhurstTables.ShortestForCapacitance || length > MedhurstTables.LongestForCapacitance))
        {
            found.Add(new Caution(
                length < 1.0 ? "coil-short" : "coil-long",
                $"{name} is {Say(length)} times as long as wide; the table of self-capacitance goes from {Say(MedhurstTables.ShortestForCapacitance)} to {Say(MedhurstTables.LongestForCapacitance)}, the value at its edge is used."));
        }
    }

    private static void AddLumped(List<Caution> found, Winding winding, string name, double hz)
    {
        double limit = LumpedLimitHz(winding.WireLengthMetre);
        if (hz > limit)
        {
            found.Add(new Caution(
                "coil-not-lumped",
                $"{name} holds {Say(winding.WireLengthMetre)} m of wire; above {Say(limit / 1e6)} MHz it is a line as much as an inductance and the figures are a guide only."));
        }
    }

    private static string Say(double value) => value.ToString("G3", CultureInfo.InvariantCulture);
}
