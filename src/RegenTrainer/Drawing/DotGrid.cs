namespace RegenTrainer.Drawing;

/// <summary>A plot of dots, several to a cell.</summary>
internal sealed class DotGrid
{
    private readonly Glyphs _glyphs;
    private readonly int _columns;
    private readonly int _rows;
    private readonly byte[] _bits;

    public DotGrid(int columns, int rows, Glyphs glyphs)
    {
        (_columns, _rows, _glyphs) = (columns, rows, glyphs);
        _bits = new byte[columns * rows];
    }

    /// <summary>Dots side by side.</summary>
    public int Width => _columns * _glyphs.DotsAcross;

    /// <summary>Dots one above the other.</summary>
    public int Height => _rows * _glyphs.DotsDown;

    /// <summary>Draws a line between two points in dots; what lies outside is cut off.</summary>
    public void Line(double x0, double y0, double x1, double y1)
    {
        double steps = Math.Ceiling(Math.Max(Math.Abs(x1 - x0), Math.Min(Math.Abs(y1 - y0), 4.0 * Height)));
        for (int k = 0; k <= steps; k++)
        {
            double t = steps == 0 ? 0 : k / steps;
            Dot((int)Math.Round(x0 + ((x1 - x0) * t)), (int)Math.Round(y0 + ((y1 - y0) * t)));
        }
    }

    /// <summary>Draws a line through points in dots, interrupted as the stroke says; what lies outside is cut off.</summary>
    public void Line(IEnumerable<(double X, double Y)> points, Stroke stroke)
    {
        (double X, double Y)? before = null;
        int along = 0;
        foreach ((double x, double y) in points)
        {
            if (before is var (x0, y0))
            {
                double steps = Math.Ceiling(Math.Max(Math.Abs(x - x0), Math.Min(Math.Abs(y - y0), 4.0 * Height)));
                for (int k = 0; k < steps; k++)
                {
                    if (along++ % (stroke.On + stroke.Off) < stroke.On)
                    {
                        Dot((int)Math.Round(x0 + ((x - x0) * k / steps)), (int)Math.Round(y0 + ((y - y0) * k / steps)));
                    }
                }
            }

            before = (x, y);
        }
    }

    /// <summary>The uppermost row of cells a column has a dot in; the number of rows where it has none.</summary>
    public int TopOf(int column)
    {
        int row = 0;
        while (row < _rows && _bits[(row * _columns) + column] == 0)
        {
            row++;
        }

        return row;
    }

    /// <summary>Copies the cells that have dots to a screen.</summary>
    public void CopyTo(Canvas canvas, int left, int top, Ink ink)
    {
        for (int k = 0; k < _bits.Length; k++)
        {
            if (_bits[k] != 0)
            {
                canvas.Set(left + (k % _columns), top + (k / _columns), _glyphs.Pattern(_bits[k]), ink);
            }
        }
    }

    private void Dot(int x, int y)
    {
        if ((uint)x < (uint)Width && (uint)y < (uint)Height)
        {
            (int across, int down) = (_glyphs.DotsAcross, _glyphs.DotsDown);
            _bits[(y / down * _columns) + (x / across)] |= _glyphs.Bit(x % across, y % down);
        }
    }
}

/// <summary>How a line is interrupted, in dots along it.</summary>
/// <param name="On">Dots drawn, 1 or more.</param>
/// <param name="Off">Dots left out after them, 0 or more.</param>
internal readonly record struct Stroke(int On, int Off);
