namespace RegenTrainer.Drawing;

/// <summary>A scale of a plot: values to places between 0 and 1, and where its marks stand.</summary>
/// <param name="From">Value at place 0.</param>
/// <param name="To">Value at place 1; another than <paramref name="From"/>.</param>
/// <param name="Logarithmic">Whether equal ratios are equal lengths; both ends are above 0 then.</param>
internal readonly record struct Axis(double From, double To, bool Logarithmic)
{
    private static readonly double[] _steps = [1, 2, 5];

    /// <summary>The place of a value, 0 at <see cref="From"/> and 1 at <see cref="To"/>.</summary>
    public double PlaceOf(double value) => Logarithmic ? Math.Log(value / From) / Math.Log(To / From) : (value - From) / (To - From);

    /// <summary>The value at a place.</summary>
    public double ValueAt(double place) => Logarithmic ? From * Math.Pow(To / From, place) : From + ((To - From) * place);

    /// <summary>A scale that holds values with round ends; a logarithmic one where they are all above 0 and asked for.</summary>
    /// <param name="values">The values, at least one.</param>
    /// <param name="logarithmic">Whether equal ratios shall be equal lengths.</param>
    public static Axis Holding(IReadOnlyCollection<double> values, bool logarithmic)
    {
        (double least, double most) = (values.Min(), values.Max());
        if (logarithmic && least > 0)
        {
            (double from, double to) = (RoundDown(least), RoundUp(most));
            return new Axis(from, to > from ? to : from * 2, true);
        }

        double step = Step(Math.Max(most - least, Math.Max(Math.Abs(most), 1e-9) * 0.05), 4);
        (double low, double high) = (Math.Floor(least / step) * step, Math.Ceiling(most / step) * step);
        return new Axis(low, high > low ? high : low + step, false);
    }

    /// <summary>Round values along the scale, at most so many.</summary>
    public IReadOnlyList<double> Marks(int most)
    {
        (double low, double high) = (Math.Min(From, To), Math.Max(From, To));
        var marks = new List<double>();
        if (Logarithmic)
        {
            double decades = Math.Log10(high / low);
            double[] steps = decades * _steps.Length <= most ? _steps : decades * 2 <= most + 1 ? [1, 3] : [1];
            for (double decade = Math.Pow(10, Math.Floor(Math.Log10(low) + 1e-9)); decade <= high * (1 + 1e-9); decade *= 10)
            {
                marks.AddRange(steps.Select(step => decade * step).Where(value => value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)));
            }

            return marks;
        }

        double width = Step(high - low, most);
        for (double value = Math.Ceiling((low / width) - 1e-9) * width; value <= high + (width * 1e-9); value += width)
        {
            marks.Add(Math.Abs(value) < width * 1e-9 ? 0 : value);
        }

        return marks;
    }

    /// <summary>The least step of 1, 2 or 5 times a power of ten that divides a span into at most so many pieces.</summary>
    private static double Step(double span, int most)
    {
        double decade = Math.Pow(10, Math.Floor(Math.Log10(span / most)));
        return decade * (_steps.FirstOrDefault(step => span / (decade * step) <= most * (1 + 1e-9)) is > 0 and var found ? found : 10);
    }

    private static double RoundDown(double value)
    {
        double decade = Math.Pow(10, Math.Floor(Math.Log10(value)));
        return decade * _steps.Last(step => decade * step <= value * (1 + 1e-9));
    }

    private static double RoundUp(double value)
    {
        double decade = Math.Pow(10, Math.Floor(Math.Log10(value)));
        return decade * (_steps.FirstOrDefault(step => decade * step >= value * (1 - 1e-9)) is > 0 and var found ? found : 10);
    }
}
