using System.Collections.ObjectModel;
using System.Globalization;

namespace RegenTrainer.Core.Quantities;

/// <summary>A series of preferred values for resistors and capacitors (IEC 60063).</summary>
public sealed class PreferredSeries
{
    /// <summary>Values closer than this share of themselves count as the same, so that rounding does not stop a walk along the series.</summary>
    private const double SameShare = 1e-9;

    private static readonly int[] _e24 =
    [
        10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91,
    ];

    private readonly int _figures;

    private PreferredSeries(string name, int[] values, int figures)
    {
        Name = name;
        Values = new ReadOnlyCollection<int>(values);
        _figures = figures;
    }

    /// <summary>Three values a decade.</summary>
    public static PreferredSeries E3 { get; } = OfTwoFigures(3);

    /// <summary>Six values a decade, 20 % parts.</summary>
    public static PreferredSeries E6 { get; } = OfTwoFigures(6);

    /// <summary>Twelve values a decade, 10 % parts.</summary>
    public static PreferredSeries E12 { get; } = OfTwoFigures(12);

    /// <summary>Twenty-four values a decade, 5 % parts.</summary>
    public static PreferredSeries E24 { get; } = OfTwoFigures(24);

    /// <summary>Forty-eight values a decade, 2 % parts.</summary>
    public static PreferredSeries E48 { get; } = OfThreeFigures(48);

    /// <summary>Ninety-six values a decade, 1 % parts.</summary>
    public static PreferredSeries E96 { get; } = OfThreeFigures(96);

    /// <summary>One hundred and ninety-two values a decade, 0.5 % parts.</summary>
    public static PreferredSeries E192 { get; } = OfThreeFigures(192);

    /// <summary>All series of the standard, coarsest first.</summary>
    public static IReadOnlyList<PreferredSeries> All { get; } = [E3, E6, E12, E24, E48, E96, E192];

    /// <summary>The name in the standard, such as <c>E24</c>.</summary>
    public string Name { get; }

    /// <summary>The values of one decade in rising order: 10 to 99 for E3 to E24, 100 to 999 for the finer series.</summary>
    public IReadOnlyList<int> Values { get; }

    /// <summary>The series of a name such as <c>E24</c> in either case; null where there is none.</summary>
    public static PreferredSeries? ByName(string name)
    {
        ArgumentNullException.ThrowIfNull(name);
        return All.FirstOrDefault(series => string.Equals(series.Name, name, StringComparison.OrdinalIgnoreCase));
    }

    /// <summary>The preferred value with the smallest ratio to the given one; of two alike the lower.</summary>
    /// <param name="value">1e-30 to 1e30.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value lies outside that range.</exception>
    public double Nearest(double value)
    {
        double best = double.NaN;
        double bestRatio = double.PositiveInfinity;
        foreach (double candidate in Around(value))
        {
            double ratio = Math.Max(candidate / value, value / candidate);
            if (ratio < bestRatio)
            {
                best = candidate;
                bestRatio = ratio;
            }
        }

        return best;
    }

    /// <summary>The next preferred value above the given one, never the same; the given value need not be a preferred one.</summary>
    /// <param name="value">1e-30 to 1e30.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value lies outside that range.</exception>
    public double Above(double value) => Around(value).First(candidate => candidate > value * (1.0 + SameShare));

    /// <summary>The next preferred value below the given one, never the same; the given value need not be a preferred one.</summary>
    /// <param name="value">1e-30 to 1e30.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value lies outside that range.</exception>
    public double Below(double value) => Around(value).Last(candidate => candidate < value * (1.0 - SameShare));

    /// <inheritdoc/>
    public override string ToString() => Name;

    private static PreferredSeries OfTwoFigures(int count)
    {
        int step = _e24.Length / count;
        return new PreferredSeries(NameOf(count), [.. Enumerable.Range(0, count).Select(i => _e24[i * step])], 2);
    }

    private static PreferredSeries OfThreeFigures(int count) =>
        new(NameOf(count), [.. Enumerable.Range(0, count).Select(i => Rounded(i, count))], 3);

    private static int Rounded(int index, int count)
    {
        int rounded = (int)Math.Round(100.0 * Math.Pow(10.0, (double)index / count));

        // The one place where the standard's E192 departs from the rounded power.
        return rounded == 919 ? 920 : rounded;
    }

    private static string NameOf(int count) => "E" + count.ToString(CultureInfo.InvariantCulture);

    /// <summary>The preferred values of the decade of a value and of its neighbours, rising.</summary>
    private List<double> Around(double value)
    {
        int decade = (int)Math.Floor(Math.Log10(Guard.InRange(value, 1e-30, 1e30, nameof(value))));
        List<double> candidates = new(3 * Values.Count);
        for (int power = decade - 1; power <= decade + 1; power++)
        {
            foreach (int digits in Values)
            {
                // Reading the decimal gives the double nearest to it, the very one a text such as 4k7 reads as.
                string text = string.Create(CultureInfo.InvariantCulture, $"{digits}e{power + 1 - _figures}");
                candidates.Add(double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture));
            }
        }

        return candidates;
    }
}
