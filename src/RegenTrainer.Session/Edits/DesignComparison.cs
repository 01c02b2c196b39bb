using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session.Edits;

/// <summary>Whether two designs, or two values, say the same.</summary>
internal static class DesignComparison
{
    public static bool Same(StageDesign a, StageDesign b) =>
        ReferenceEquals(a, b)
        || (ReferenceEquals(a.Family, b.Family) && a.Title == b.Title && a.Note == b.Note && a.OutputNode == b.OutputNode
            && a.ExtraParts.SequenceEqual(b.ExtraParts)
            && a.Values.Count == b.Values.Count
            && a.Values.All(v => b.Values.TryGetValue(v.Key, out FieldValue? other) && Same(v.Value, other))
            && a.Devices.Count == b.Devices.Count
            && a.Devices.All(d => b.Devices.TryGetValue(d.Key, out var other) && d.Value.Name == other.Name));

    /// <summary>Both may be null: not given.</summary>
    public static bool Same(FieldValue? a, FieldValue? b) =>
        a is null || b is null
            ? a is null && b is null
            : a.Number == b.Number && a.Text == b.Text && a.TolerancePercent == b.TolerancePercent && a.Pairs.SequenceEqual(b.Pairs);
}
