using RegenTrainer.Core.Readings;

namespace RegenTrainer.Files.Reports;

/// <summary>A coil's own figures as JSON, schema <c>regentrainer.coil/1</c>.</summary>
public static class CoilJson
{
    /// <summary>Writes a coil as UTF-8 text.</summary>
    /// <param name="stage">The stage's title; null for a coil by itself.</param>
    /// <param name="coil">The coil.</param>
    public static byte[] Write(string? stage, CoilReading coil) =>
        Report.Write("coil", stage, SettingKeys.At(coil.TemperatureCelsius), coil.Cautions, writer =>
        {
            WindingReading first = coil.Windings[0];
            writer.Number("inductance_henry", first.InductanceHenry);
            writer.Matrix("inductance_matrix_henry", coil.MatrixHenry);
            writer.Number("q", first.Q);
            writer.Number("at_hz", coil.AtHz);
            writer.Number("resistance_ohm", first.ResistanceOhm);
            writer.Number("self_capacitance_farad", first.SelfCapacitanceFarad);
            writer.Number("wire_length_metre", first.WireLengthMetre);
            writer.Number("effective_height_metre", coil.EffectiveHeightMetre);
            writer.List("windings", coil.Windings, (w, winding) =>
            {
                w.Word("name", winding.Name);
                w.Whole("turns", winding.Turns);
                w.Number("inductance_henry", winding.InductanceHenry);
                w.Number("q", winding.Q);
                w.Number("resistance_ohm", winding.ResistanceOhm);
                w.Number("self_capacitance_farad", winding.SelfCapacitanceFarad);
                w.Number("wire_length_metre", winding.WireLengthMetre);
            });
        });
}
