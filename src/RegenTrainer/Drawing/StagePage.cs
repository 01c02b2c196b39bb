using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>Page 1: the response around the station and the figures of the stage now.</summary>
internal static class StagePage
{
    /// <summary>Draws the page.</summary>
    public static void Draw(Canvas canvas, Region region, StageSnapshot stage, in Compared compared)
    {
        ResponsePlot.Draw(canvas, Plot(region, compared), stage, compared);
        int width = ReadoutWidth(region, compared);
        ReadoutColumn.Draw(canvas, region with { Left = region.Right - width, Width = width }, stage.Reading, compared.Pinned?.Reading);
    }

    /// <summary>Points of the response a region of this size can show.</summary>
    public static int PointsFor(Region region, Glyphs glyphs, in Compared compared) => ResponsePlot.PointsFor(Plot(region, compared), glyphs);

    /// <summary>How far from the station a cell of the curve's picture lies, in Hz; null outside of it.</summary>
    public static double? OffsetAt(Region region, in Compared compared, int column, int row) =>
        ResponsePlot.OffsetAt(Plot(region, compared), column, row);

    private static Region Plot(Region region, in Compared compared)
    {
        int room = region.Width - ReadoutWidth(region, compared) - (IsNarrow(region) ? 2 : 4);
        return region with { Width = ResponsePlot.EvenWidth(room) };
    }

    private static int ReadoutWidth(Region region, in Compared compared) =>
        (IsNarrow(region) ? 28 : 32) + (compared.Pinned is null ? 0 : ReadoutColumn.DifferenceWidth);

    private static bool IsNarrow(Region region) => region.Width < 98;
}
