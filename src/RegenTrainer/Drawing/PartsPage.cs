using RegenTrainer.Core.Stages;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>
/// The Parts panel: on the left every value of the design; on the right what there is to say of the selected one, the coil, the
/// response with that of before dotted, and the main figures; beneath a line for the keys or what is wrong.
/// </summary>
internal static class PartsPage
{
    private const int LabelWidth = 21;
    private const int ValueFrom = PickList.MarkWidth + LabelWidth + 3;
    private const int Readouts = 4;
    private const int WidestReadouts = 44;

    /// <summary>Rows from which on there is room for everything.</summary>
    private const int TallFrom = 18;

    /// <summary>Rows a picture needs to have its heading and the neighbours named.</summary>
    private const int FullPlotRows = 13;

    private const string Given = "=";

    /// <summary>Rows of the list that are seen.</summary>
    public static int ListRows(Region region) => region.Height - 1;

    /// <summary>The region of the list.</summary>
    public static Region List(Region region) => region with { Width = IsNarrow(region) ? 41 : 47, Height = ListRows(region) };

    /// <summary>The region in which a list to pick from stands, below its heading.</summary>
    public static Region Pick(Region region)
    {
        Region right = Right(region);
        return right with { Top = right.Top + 1, Height = right.Height - 1 };
    }

    /// <summary>Where the value in a row of the list is typed.</summary>
    public static Region Value(Region region, int row)
    {
        Region list = List(region);
        return new Region(list.Left + ValueFrom, list.Top + row, list.Width - ValueFrom, 1);
    }

    /// <summary>Points of the response there is room for.</summary>
    public static int PointsFor(Region region, Glyphs glyphs) => ResponsePlot.PointsFor(Plot(region), glyphs);

    /// <summary>Draws the panel.</summary>
    public static void Draw(Canvas canvas, Region region, PartsPicture parts, StageSnapshot stage, in Compared compared)
    {
        DrawList(canvas, region, parts);
        if (parts.Pick is { } pick)
        {
            Region right = Right(region);
            canvas.Put(right.Left + PickList.MarkWidth, right.Top, pick.Heading, Ink.Label, right.Right);
            PickList.Draw(canvas, Pick(region), pick.Entries, pick.Selected, pick.Top);
        }
        else
        {
            DrawRight(canvas, region, parts, stage, compared);
        }

        bool wrong = parts.Refusal.Length > 0;
        canvas.Put(region.Left, region.Bottom - 1, wrong ? parts.Refusal : parts.Hint, wrong ? Ink.Caution : Ink.Label, region.Right);
    }

    private static void DrawList(Canvas canvas, Region region, PartsPicture parts)
    {
        Region list = List(region);
        for (int k = 0; k < list.Height && parts.Top + k < parts.Rows.Count; k++)
        {
            PartRow row = parts.Rows[parts.Top + k];
            if (row.Field is not { } field)
            {
                canvas.Put(list.Left, list.Top + k, row.Section, Ink.Heading, list.Right);
                continue;
            }

            bool chosen = parts.Top + k == parts.Selected, given = parts.Design.Gives(field.Key);
            Ink ink = chosen ? Ink.Heading : given ? Ink.Text : Ink.Label;
            PickList.Mark(canvas, list, k, chosen);
            int left = list.Left + PickList.MarkWidth;
            canvas.Put(left, list.Top + k, k == 0 ? row.Label : row.ShortLabel, chosen ? Ink.Heading : Ink.Label, left + LabelWidth);
            if (given)
            {
                canvas.Put(left + LabelWidth + 1, list.Top + k, Given, ink);
            }

            canvas.Put(list.Left + ValueFrom, list.Top + k, PartValue.Shown(field, parts.Design), ink, list.Right);
        }

        if (parts.FaultAt is { } at)
        {
            DrawFault(canvas, region, parts, at);
        }
    }

    /// <summary>Points from the next row, or from the one above in the last, at the first wrong character.</summary>
    private static void DrawFault(Canvas canvas, Region region, PartsPicture parts, int at)
    {
        int row = parts.Selected - parts.Top;
        Region value = Value(region, row + 1 < ListRows(region) ? row + 1 : row - 1);
        canvas.Put(value.Left, value.Top, new string(' ', value.Width), Ink.Text);
        canvas.Set(value.Left + Math.Min(at, value.Width - 1), value.Top, "^", Ink.Caution);
    }

    private static void DrawRight(Canvas canvas, Region region, PartsPicture parts, StageSnapshot stage, in Compared compared)
    {
        Region right = Right(region);
        Field field = parts.Rows[parts.Selected].Field!;
        PartDetails.Draw(canvas, right with { Height = DetailRows(right) }, field, parts.Design, parts.Saved);
        PartDetails.DrawCoil(canvas, right with { Top = right.Top + DetailRows(right) + GapRows(right), Height = CoilRows(right) }, parts.Coil);
        Region plot = Plot(region);
        ResponsePlot.Draw(canvas, plot, stage, compared, bare: plot.Height < FullPlotRows);
        Region figures = right with { Top = right.Bottom - Readouts, Width = Math.Min(right.Width, WidestReadouts), Height = Readouts };
        ReadoutColumn.DrawChange(canvas, figures, stage.Reading, (compared.Before ?? compared.Pinned)?.Reading);
    }

    private static Region Right(Region region)
    {
        Region list = List(region);
        int left = list.Right + (IsNarrow(region) ? 1 : 3);
        return new Region(left, region.Top, region.Right - left, list.Height);
    }

    private static Region Plot(Region region)
    {
        Region right = Right(region);
        int top = right.Top + DetailRows(right) + CoilRows(right) + (2 * GapRows(right));
        return new Region(right.Left, top, ResponsePlot.EvenWidth(right.Width), right.Bottom - Readouts - GapRows(right) - top);
    }

    private static int DetailRows(Region right) => right.Height switch { < TallFrom => 4, < 30 => 5, _ => 9 };

    private static int CoilRows(Region right) => right.Height < TallFrom ? 1 : 2;

    private static int GapRows(Region right) => right.Height < 30 ? 0 : 1;

    private static bool IsNarrow(Region region) => region.Width < 98;
}
