using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Drawing;

/// <summary>What there is to say of one field: meaning, range, tolerance and origin; of a device its figures and how they are known.</summary>
internal static class PartDetails
{
    private const string NotGiven = " where not given";
    private const string Between = ", ";

    /// <summary>Rows below the meaning: range and origin.</summary>
    private const int RowsBelow = 2;

    /// <summary>Draws it into a region, the most important first.</summary>
    public static void Draw(Canvas canvas, Region region, Field field, StageDesign design, StageDesign saved)
    {
        string[] meaning = field.Meaning.Split("; ", 2);
        bool saysDefault = meaning.Length > 1 && meaning[1].EndsWith(NotGiven, StringComparison.Ordinal);
        int row = canvas.PutWrapped(region with { Height = region.Height - RowsBelow }, saysDefault ? meaning[0] : field.Meaning, Ink.Heading);
        string origin = Origin(field, design, saved, saysDefault ? meaning[1][..^NotGiven.Length] : "none");
        if (field.Kind == FieldKind.Device)
        {
            row = PutLine(canvas, region, row, origin, Ink.Text);
            if (design.Devices.TryGetValue(field.Key, out DeviceModel? model))
            {
                DeviceFigures.Draw(canvas, region with { Top = row, Height = region.Bottom - row }, model);
            }

            return;
        }

        string step = PartValue.Step(field);
        row = PutLine(canvas, region, row, PartValue.Range(field) + (step.Length > 0 ? Between + step : ""), Ink.Text);
        string tolerance = Tolerance(field, design);
        PutLine(canvas, region, row, origin + (tolerance.Length > 0 ? Between + tolerance : ""), Ink.Text);
    }

    /// <summary>The coil beside its dimensions, in one row or two.</summary>
    public static void DrawCoil(Canvas canvas, Region region, CoilReading? coil)
    {
        if (coil is null)
        {
            return;
        }

        WindingReading winding = coil.Windings[0];
        string main = $"{Figures.Quantity(winding.InductanceHenry, Unit.Henry)}  Q {Figures.Q(winding.Q)}";
        string? more = winding.SelfCapacitanceFarad is { } farad ? Figures.Quantity(farad, Unit.Farad) : null;
        string? wire = winding.WireLengthMetre is { } metre ? Length(metre) : null;
        if (region.Height == 1)
        {
            int column = canvas.Put(region.Left, region.Top, "coil ", Ink.Label, region.Right);
            canvas.Put(column, region.Top, string.Join("  ", new[] { main, more, wire }.Where(part => part is not null)), Ink.Text, region.Right);
            return;
        }

        int after = canvas.Put(region.Left, region.Top, $"coil at {Figures.Dial(coil.AtHz)}  ", Ink.Label, region.Right);
        canvas.Put(after, region.Top, main, Ink.Text, region.Right);
        if (more is not null || wire is not null)
        {
            canvas.Put(region.Left, region.Top + 1, $"  self-capacitance {more ?? Figures.None}, wire {wire ?? Figures.None}", Ink.Text, region.Right);
        }
    }

    private static int PutLine(Canvas canvas, Region region, int row, string text, Ink ink) =>
        canvas.PutWrapped(region with { Top = row, Height = Math.Max(0, region.Bottom - row) }, text, ink);

    private static string Length(double metre) => Figures.Fixed(metre, metre < 10 ? "0.00" : "0.0") + " m";

    private static string Origin(Field field, StageDesign design, StageDesign saved, string otherwise)
    {
        bool same = Equal(design.Values.GetValueOrDefault(field.Key), saved.Values.GetValueOrDefault(field.Key));
        string unsaved = same ? "" : ", not saved yet";
        if (design.Gives(field.Key))
        {
            return "given" + unsaved;
        }

        if (field.OnlyWith is { } condition && !condition.Holds(design.WordOrNull))
        {
            return "only with " + condition.Phrase + unsaved;
        }

        bool hasDefault = field.Default is not null || field.DefaultText is not null;
        return (hasDefault ? "default" : "not given: " + otherwise) + unsaved;
    }

    private static bool Equal(FieldValue? a, FieldValue? b) =>
        ReferenceEquals(a, b) || (a is not null && b is not null && a.Number == b.Number && a.Text == b.Text && a.TolerancePercent == b.TolerancePercent);

    private static string Tolerance(Field field, StageDesign design)
    {
        if (design.Values.TryGetValue(field.Key, out FieldValue? given) && given.TolerancePercent is { } own)
        {
            return $"its own \u00b1{Figures.Fixed(own, "0.##")} %";
        }

        return ToleranceFields.KeyFor(field.Tolerance) is { } key && design.NumberOrNull(key) is { } percent
            ? $"\u00b1{Figures.Fixed(percent, "0.##")} %"
            : "";
    }
}
