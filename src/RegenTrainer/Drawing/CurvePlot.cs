namespace RegenTrainer.Drawing;

/// <summary>One curve of a plot.</summary>
/// <param name="Name">Its name in the legend; empty leaves it out there.</param>
/// <param name="Ink">Its ink.</param>
/// <param name="Stroke">How it is interrupted, so that curves differ without colour too.</param>
/// <param name="Points">Its points; one without value leaves a gap.</param>
internal sealed record PlotCurve(string Name, Ink Ink, Stroke Stroke, IReadOnlyList<(double X, double? Y)> Points);

/// <summary>A plot of several curves over one scale each way.</summary>
/// <param name="X">The scale across.</param>
/// <param name="Y">The scale upward.</param>
/// <param name="WriteX">Writes a mark of the scale across.</param>
/// <param name="WriteY">Writes a mark of the scale upward.</param>
/// <param name="UnitX">Unit after the last mark across.</param>
internal sealed record CurvePlot(Axis X, Axis Y, Func<double, string> WriteX, Func<double, string> WriteY, string UnitX)
{
    private const int ScaleWidth = 7;

    /// <summary>Rows beside the picture: legend, rule and scale.</summary>
    private const int OtherRows = 3;

    private const int ColumnsPerMark = 9;

    private const int RowsPerMark = 3;

    /// <summary>The cells of the picture itself.</summary>
    public static Region Picture(Region region) =>
        new(region.Left + ScaleWidth, region.Top + 1, region.Width - ScaleWidth, region.Height - OtherRows);

    /// <summary>The column of a value across.</summary>
    public int ColumnOf(Region region, double x)
    {
        Region picture = Picture(region);
        return picture.Left + (int)Math.Round(X.PlaceOf(x) * (picture.Width - 1), MidpointRounding.AwayFromZero);
    }

    /// <summary>The row of a value upward.</summary>
    public int RowOf(Region region, double y)
    {
        Region picture = Picture(region);
        return picture.Bottom - 1 - (int)Math.Round(Y.PlaceOf(y) * (picture.Height - 1), MidpointRounding.AwayFromZero);
    }

    /// <summary>The value across at a cell; null outside of the picture.</summary>
    public double? XAt(Region region, int column, int row)
    {
        Region picture = Picture(region);
        return column >= picture.Left && column < picture.Right && row >= picture.Top && row < picture.Bottom + 2
            ? X.ValueAt((column - picture.Left) / (double)(picture.Width - 1))
            : null;
    }

    /// <summary>Draws scales, legend and curves, the last on top.</summary>
    public void Draw(Canvas canvas, Region region, IReadOnlyList<PlotCurve> curves)
    {
        Region picture = Picture(region);
        Scales(canvas, region, picture);
        int column = region.Left;
        foreach (PlotCurve curve in curves)
        {
            Curve(canvas, picture, curve);
            if (curve.Name.Length > 0)
            {
                column = canvas.Put(column, region.Top, Sample(canvas.Glyphs, curve.Stroke), curve.Ink, region.Right);
                column = canvas.Put(column + 1, region.Top, curve.Name, Ink.Text, region.Right) + 2;
            }
        }
    }

    private static string Sample(Glyphs glyphs, Stroke stroke) =>
        stroke == glyphs.Dotted ? ". ." : stroke == glyphs.Dashed ? "- -" : glyphs.Rule + glyphs.Rule + glyphs.Rule;

    private void Curve(Canvas canvas, Region picture, PlotCurve curve)
    {
        var grid = new DotGrid(picture.Width, picture.Height, canvas.Glyphs);
        var piece = new List<(double X, double Y)>();
        foreach ((double x, double? y) in curve.Points)
        {
            if (y is { } value && double.IsFinite(value))
            {
                piece.Add((X.PlaceOf(x) * (grid.Width - 1), Math.Clamp(1 - Y.PlaceOf(value), -0.5, 1.5) * (grid.Height - 1)));
                continue;
            }

            grid.Line(piece, curve.Stroke);
            piece.Clear();
        }

        grid.Line(piece, curve.Stroke);
        grid.CopyTo(canvas, picture.Left, picture.Top, curve.Ink);
    }

    private void Scales(Canvas canvas, Region region, Region picture)
    {
        foreach (double mark in Y.Marks(Math.Max(2, picture.Height / RowsPerMark)))
        {
            canvas.PutBefore(picture.Left - 1, RowOf(region, mark), WriteY(mark), Ink.Label);
        }

        for (int column = picture.Left; column < picture.Right; column++)
        {
            canvas.Set(column, picture.Bottom, canvas.Glyphs.Rule, Ink.Label);
        }

        int free = picture.Left - 1;
        int end = canvas.WidthOf(UnitX) + 1;
        foreach (double mark in X.Marks(Math.Max(2, picture.Width / ColumnsPerMark)))
        {
            int column = ColumnOf(region, mark);
            canvas.Set(column, picture.Bottom, canvas.Glyphs.Tick, Ink.Label);
            string label = WriteX(mark);
            int start = column - (label.Length / 2);
            if (start > free && start + label.Length <= picture.Right - end)
            {
                free = canvas.Put(start, picture.Bottom + 1, label, Ink.Label);
            }
        }

        canvas.PutBefore(picture.Right, picture.Bottom + 1, UnitX, Ink.Label);
    }
}
