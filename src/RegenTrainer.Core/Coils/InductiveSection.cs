using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>A section of a winding stated by its inductance and its loss.</summary>
public sealed record InductiveSection
{
    /// <summary>Describes a section.</summary>
    /// <param name="henry">Inductance in H, above 0.</param>
    /// <param name="q">Q of the section, the same at all frequencies, above 0; no such loss when left out.</param>
    /// <param name="seriesOhm">Resistance in ohm, the same at all frequencies and temperatures, 0 or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    public InductiveSection(double henry, double? q = null, double seriesOhm = 0.0)
    {
        Henry = Guard.Positive(henry, nameof(henry));
        Q = q is { } stated ? Guard.Positive(stated, nameof(q)) : null;
        SeriesOhm = Guard.NotNegative(seriesOhm, nameof(seriesOhm));
    }

    /// <summary>Inductance in H.</summary>
    public double Henry { get; }

    /// <summary>Q, the same at all frequencies; null where the section has no such loss.</summary>
    public double? Q { get; }

    /// <summary>Resistance in ohm, the same at all frequencies.</summary>
    public double SeriesOhm { get; }
}

/// <summary>Coupling of two sections.</summary>
public sealed record SectionCoupling
{
    /// <summary>Couples two sections.</summary>
    /// <param name="first">Index of one section, 0 or more.</param>
    /// <param name="second">Index of the other, 0 or more.</param>
    /// <param name="factor">k = M/sqrt(L1 L2), -1 to 1, both excluded; negative where they point against each other.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    /// <exception cref="ArgumentException">A section is coupled to itself.</exception>
    public SectionCoupling(int first, int second, double factor)
    {
        First = Guard.NotNegative(first, nameof(first));
        Second = Guard.NotNegative(second, nameof(second));
        Factor = Guard.InRange(factor, Math.BitIncrement(-1.0), Math.BitDecrement(1.0), nameof(factor));
        if (first == second)
        {
            throw new ArgumentException($"Section {first} is coupled to itself.", nameof(second));
        }
    }

    /// <summary>Index of one section.</summary>
    public int First { get; }

    /// <summary>Index of the other section.</summary>
    public int Second { get; }

    /// <summary>k = M/sqrt(L1 L2).</summary>
    public double Factor { get; }
}
