using System.Diagnostics.CodeAnalysis;
using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Files.Stages;

/// <summary>Parts are the same when they are written the same, to the last bit.</summary>
internal sealed class PartComparer : IEqualityComparer<Part>
{
    public static PartComparer Instance { get; } = new();

    public bool Equals(Part? x, Part? y) => ReferenceEquals(x, y) || (x is not null && y is not null && PartNotation.Write(x) == PartNotation.Write(y));

    public int GetHashCode([DisallowNull] Part obj) => PartNotation.Write(obj).GetHashCode(StringComparison.Ordinal);
}
