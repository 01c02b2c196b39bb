using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>Gathers faults, so that all of a design's are reported in one go.</summary>
internal sealed class FaultList
{
    private readonly List<FieldFault> _faults = [];

    /// <summary>The faults so far.</summary>
    public IReadOnlyList<FieldFault> Faults => _faults;

    /// <summary>A quantity as it stands in a message.</summary>
    public static string Quantity(double value, Unit unit) => QuantityText.Write(value, unit, 6);

    /// <summary>Adds a fault; the phrases finish "found ..., expected ...".</summary>
    public void Add(string key, string found, string expected) => _faults.Add(new FieldFault(key, found, expected));

    /// <summary>Adds the fault that a value needed here is missing.</summary>
    public void Missing(string key, string expected) => Add(key, "nothing", expected);

    /// <summary>Adds a fault at <paramref name="lowKey"/> unless its number is below that of <paramref name="highKey"/>.</summary>
    public void Ascending(StageDesign design, string lowKey, string highKey, Unit unit, string highMeaning)
    {
        double? low = design.NumberOrNull(lowKey);
        double? high = design.NumberOrNull(highKey);
        if (low >= high)
        {
            Add(lowKey, Quantity(low.Value, unit), $"less than {Quantity(high.Value, unit)}, {highMeaning}");
        }
    }

    /// <summary>Adds a fault for a table with fewer than two pairs or one whose first column does not rise.</summary>
    /// <returns>Whether the table can be used.</returns>
    public bool Table(StageDesign design, string key, PairColumns columns)
    {
        IReadOnlyList<(double First, double Second)> pairs =
            design.Values.TryGetValue(key, out FieldValue? value) ? value.Pairs : [];
        if (pairs.Count < 2)
        {
            Add(key, pairs.Count == 0 ? "no table" : "a table of one pair", $"at least two pairs of {columns.Words}");
            return false;
        }

        for (int i = 1; i < pairs.Count; i++)
        {
            if (pairs[i].First <= pairs[i - 1].First)
            {
                Add(key, Step(pairs[i - 1].First, pairs[i].First, columns.First, i), $"pairs of {columns.Words} in rising order");
                return false;
            }
        }

        return true;
    }

    /// <summary>Adds a fault where a table's second column does not rise all along.</summary>
    public void OneWay(StageDesign design, string key, PairColumns columns)
    {
        IReadOnlyList<(double First, double Second)> pairs = design.Values[key].Pairs;
        for (int i = 1; i < pairs.Count; i++)
        {
            double step = pairs[i].Second - pairs[i - 1].Second;
            if (step <= 0)
            {
                Add(key, Step(pairs[i - 1].Second, pairs[i].Second, columns.Second, i), $"pairs of {columns.Words} that rise together");
                return;
            }
        }
    }

    private static string Step(double before, double value, Unit unit, int index) =>
        $"{Quantity(value, unit)} after {Quantity(before, unit)} in pair {index + 1}";
}

/// <summary>What the two columns of a table are.</summary>
/// <param name="Words">Both columns in words.</param>
/// <param name="First">Unit of the first.</param>
/// <param name="Second">Unit of the second.</param>
internal sealed record PairColumns(string Words, Unit First, Unit Second);
