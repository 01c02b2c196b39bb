using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Commands.Texts;

/// <summary>A coil for the eye.</summary>
internal static class CoilText
{
    /// <summary>A matrix wider than this is left to the answer in JSON.</summary>
    private const int MostColumns = 6;

    public static string Of(string title, CoilReading coil)
    {
        var sheet = new Sheet();
        sheet.Line(title);
        sheet.Row("at", Say.Quantity(coil.AtHz, Unit.Hertz, 7));
        sheet.Row("temperature", Say.Quantity(coil.TemperatureCelsius, Unit.Celsius));
        sheet.RowIf("effective height", coil.EffectiveHeightMetre is { } height ? Say.Quantity(height, Unit.Metre) : null);
        foreach (WindingReading winding in coil.Windings)
        {
            sheet.Gap();
            sheet.Line(winding.Turns is { } turns ? $"{winding.Name}, {turns} turns" : winding.Name);
            sheet.Row("inductance", Say.Quantity(winding.InductanceHenry, Unit.Henry, 5));
            sheet.Row("Q", Say.Quantity(winding.Q, Unit.None));
            sheet.Row("loss resistance", Say.Quantity(winding.ResistanceOhm, Unit.Ohm));
            sheet.RowIf("self-capacitance", winding.SelfCapacitanceFarad is { } farad ? Say.Quantity(farad, Unit.Farad) : null);
            sheet.RowIf("wire", winding.WireLengthMetre is { } metre ? Say.Fixed(metre, 2) + " m" : null);
        }

        Matrix(sheet, coil.MatrixHenry);
        return sheet.Cautions(coil.Cautions).ToString();
    }

    private static void Matrix(Sheet sheet, IReadOnlyList<IReadOnlyList<double>> henry)
    {
        if (henry.Count is < 2 or > MostColumns)
        {
            return;
        }

        sheet.Gap();
        sheet.Line("inductance between the sections, from the start of the winding");
        string[] heads = ["section", .. Enumerable.Range(1, henry.Count).Select(k => $"{k}")];
        sheet.Table(
            heads,
            [.. henry.Select((row, k) => (string[])[$"{k + 1}", .. row.Select(h => Say.Quantity(h, Unit.Henry))])],
            wordsFirst: true);
    }
}
