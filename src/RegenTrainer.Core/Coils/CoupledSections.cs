using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>Windings stated by inductance, coupling and loss rather than by their geometry.</summary>
public sealed class CoupledSections : IWindingModel
{
    // A matrix closer to singular than this cannot be told from one by the digits people write.
    private const double LeastPivot = 1e-12;

    private readonly double[] _henry;
    private readonly double[] _lossPerOhm;
    private readonly double[] _seriesOhm;
    private readonly WindingSpan[] _spans;
    private readonly double[] _selfCapacitanceFarad;

    /// <summary>Takes sections and their couplings.</summary>
    /// <param name="sections">The sections, at least one.</param>
    /// <param name="couplings">Couplings, each pair at most once; pairs not named are not coupled.</param>
    /// <param name="windings">Which sections make up which winding, covering all in order; one winding of all sections when left out.</param>
    /// <exception cref="ArgumentException">A coupling names a missing section or a pair twice, the windings leave a gap, or no
    /// arrangement of real windings has these couplings (the inductance matrix is not positive definite).</exception>
    public CoupledSections(
        IReadOnlyList<InductiveSection> sections,
        IReadOnlyList<SectionCoupling>? couplings = null,
        IReadOnlyList<WindingSpan>? windings = null)
    {
        ArgumentNullException.ThrowIfNull(sections);
        if (sections.Count == 0)
        {
            throw new ArgumentException("There is at least one section.", nameof(sections));
        }

        SectionCount = sections.Count;
        (Sections, Couplings) = ([.. sections], [.. couplings ?? []]);
        _henry = InductanceMatrix(sections, couplings ?? []);
        CheckPositiveDefinite(nameof(couplings));
        _seriesOhm = [.. sections.Select(section => section.SeriesOhm)];
        _lossPerOhm = LossMatrix(sections);
        _spans = windings is null ? [new WindingSpan(0, SectionCount, 0.0, 0.0, 0)] : CheckedSpans(windings);
        _selfCapacitanceFarad = Array.ConvertAll(_spans, span => span.SelfCapacitanceFarad);
    }

    /// <summary>The sections.</summary>
    public IReadOnlyList<InductiveSection> Sections { get; }

    /// <summary>The couplings stated; pairs not named are not coupled.</summary>
    public IReadOnlyList<SectionCoupling> Couplings { get; }

    /// <inheritdoc/>
    public int SectionCount { get; }

    /// <inheritdoc/>
    public IReadOnlyList<WindingSpan> Windings => _spans;

    /// <inheritdoc/>
    public IReadOnlyList<double> SelfCapacitanceFarad => _selfCapacitanceFarad;

    /// <summary>
    /// One tapped winding on a closed or open core: sections in proportion to their turns squared, one coupling factor between
    /// all of them, normalised so that the whole winding has the inductance factor times turns squared.
    /// </summary>
    /// <param name="henryPerTurnSquared">Inductance factor of the core in H, above 0.</param>
    /// <param name="sectionTurns">Turns of each section, 1 or more.</param>
    /// <param name="couplingFactor">Coupling between any two sections, 0 to below 1; usual values, from memory: 0.90 on a rod, 0.99 on a ring.</param>
    /// <param name="q">Q of the whole winding, the same at all frequencies, above 0.</param>
    /// <param name="selfCapacitanceFarad">Capacitance across the whole winding in F, 0 or more.</param>
    /// <exception cref="ArgumentException">A value lies outside its range or there is no section.</exception>
    public static CoupledSections OnCore(
        double henryPerTurnSquared,
        IReadOnlyList<int> sectionTurns,
        double couplingFactor,
        double q,
        double selfCapacitanceFarad = 0.0)
    {
        ArgumentNullException.ThrowIfNull(sectionTurns);
        double factor = Guard.Positive(henryPerTurnSquared, nameof(henryPerTurnSquared));
        double coupling = Guard.InRange(couplingFactor, 0.0, Math.BitDecrement(1.0), nameof(couplingFactor));
        double capacitance = Guard.NotNegative(selfCapacitanceFarad, nameof(selfCapacitanceFarad));
        double turns = 0.0;
        double squares = 0.0;
        foreach (int count in sectionTurns)
        {
            turns += Guard.InRange(count, 1, Winding.MostTurns, nameof(sectionTurns));
            squares += (double)count * count;
        }

        double whole = turns * turns;
        double scale = factor * whole / (squares + (coupling * (whole - squares)));
        List<SectionCoupling> couplings = [];
        for (int first = 0; first < sectionTurns.Count; first++)
        {
            for (int second = first + 1; second < sectionTurns.Count; second++)
            {
                couplings.Add(new SectionCoupling(first, second, coupling));
            }
        }

        return new CoupledSections(
            [.. sectionTurns.Select(count => new InductiveSection(scale * count * count, q))],
            couplings,
            [new WindingSpan(0, sectionTurns.Count, capacitance, 0.0, (int)turns)]);
    }

    /// <inheritdoc/>
    public double Henry(int i, int j)
    {
        int row = Guard.InRange(i, 0, SectionCount - 1, nameof(i));
        int column = Guard.InRange(j, 0, SectionCount - 1, nameof(j));
        return _henry[(row * SectionCount) + column];
    }

    /// <inheritdoc/>
    public double DcOhm(int section, double temperatureCelsius)
    {
        int index = Guard.InRange(section, 0, SectionCount - 1, nameof(section));
        Guard.InRange(temperatureCelsius, -100.0, 200.0, nameof(temperatureCelsius));
        return _seriesOhm[index];
    }

    /// <summary>
    /// Fills in the loss-resistance matrix: stated resistances on the diagonal, and for stated Q the loss tangent of the shared
    /// field, 2 pi f L_ij/sqrt(Q_i Q_j), so that sections of one Q have that Q in any connection.
    /// </summary>
    /// <inheritdoc/>
    public void SeriesOhm(double hz, double temperatureCelsius, Span<double> matrix)
    {
        double omega = 2.0 * Math.PI * Guard.NotNegative(hz, nameof(hz));
        Guard.InRange(temperatureCelsius, -100.0, 200.0, nameof(temperatureCelsius));
        if (matrix.Length != _henry.Length)
        {
            throw new ArgumentException($"The matrix needs room for {_henry.Length} elements, not {matrix.Length}.", nameof(matrix));
        }

        for (int element = 0; element < matrix.Length; element++)
        {
            matrix[element] = omega * _lossPerOhm[element];
        }

        for (int section = 0; section < SectionCount; section++)
        {
            matrix[(section * SectionCount) + section] += _seriesOhm[section];
        }
    }

    /// <summary>No caution: nothing here rests on a table, and the wire is not known.</summary>
    /// <inheritdoc/>
    public IReadOnlyList<Caution> CautionsAt(double hz)
    {
        Guard.NotNegative(hz, nameof(hz));
        return [];
    }

    private static double[] InductanceMatrix(IReadOnlyList<InductiveSection> sections, IReadOnlyList<SectionCoupling> couplings)
    {
        int count = sections.Count;
        double[] matrix = new double[count * count];
        for (int section = 0; section < count; section++)
        {
            matrix[(section * count) + section] = sections[section].Henry;
        }

        HashSet<(int, int)> named = [];
        foreach (SectionCoupling coupling in couplings)
        {
            (int low, int high) = (Math.Min(coupling.First, coupling.Second), Math.Max(coupling.First, coupling.Second));
            if (high >= count)
            {
                throw new ArgumentException($"A coupling names section {high}; the last one is {count - 1}.", nameof(couplings));
            }

            if (!named.Add((low, high)))
            {
                throw new ArgumentException($"Sections {low} and {high} are coupled twice.", nameof(couplings));
            }

            double mutual = coupling.Factor * Math.Sqrt(sections[low].Henry * sections[high].Henry);
            matrix[(low * count) + high] = mutual;
            matrix[(high * count) + low] = mutual;
        }

        return matrix;
    }

    private double[] LossMatrix(IReadOnlyList<InductiveSection> sections)
    {
        double[] root = [.. sections.Select(section => section.Q is { } q ? 1.0 / Math.Sqrt(q) : 0.0)];
        double[] matrix = new double[_henry.Length];
        for (int element = 0; element < matrix.Length; element++)
        {
            matrix[element] = _henry[element] * root[element / SectionCount] * root[element % SectionCount];
        }

        return matrix;
    }

    /// <summary>Cholesky's factorisation of the matrix scaled to a unit diagonal: it exists for positive definite matrices alone.</summary>
    private void CheckPositiveDefinite(string name)
    {
        int count = SectionCount;
        double[] factor = new double[count * count];
        for (int row = 0; row < count; row++)
        {
            for (int column = 0; column <= row; column++)
            {
                double rest = _henry[(row * count) + column]
                    / Math.Sqrt(_henry[(row * count) + row] * _henry[(column * count) + column]);
                for (int inner = 0; inner < column; inner++)
                {
                    rest -= factor[(row * count) + inner] * factor[(column * count) + inner];
                }

                if (column < row)
                {
                    factor[(row * count) + column] = rest / factor[(column * count) + column];
                }
                else if (rest > LeastPivot)
                {
                    factor[(row * count) + row] = Math.Sqrt(rest);
                }
                else
                {
                    throw new ArgumentException(
                        $"No real windings have these couplings: with section {row} the inductance matrix stops being positive definite. "
                        + "Lower the coupling factors of that section.",
                        name);
                }
            }
        }
    }

    private WindingSpan[] CheckedSpans(IReadOnlyList<WindingSpan> windings)
    {
        int next = 0;
        foreach (WindingSpan span in windings)
        {
            if (span.FirstSection != next || span.SectionCount < 1)
            {
                throw new ArgumentException(
                    $"A winding begins at section {span.FirstSection} with {span.SectionCount}; the next free section is {next}.", nameof(windings));
            }

            Guard.NotNegative(span.SelfCapacitanceFarad, nameof(windings));
            next += span.SectionCount;
        }

        return next == SectionCount
            ? [.. windings]
            : throw new ArgumentException($"The windings hold {next} sections; there are {SectionCount}.", nameof(windings));
    }
}
