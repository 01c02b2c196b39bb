using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Circuits;

/// <summary>Two loss-free sections with a given mutual inductance.</summary>
internal sealed class SectionPair(double first, double second, double mutual) : IWindingModel
{
    public int SectionCount => 2;

    public IReadOnlyList<WindingSpan> Windings => [];

    public IReadOnlyList<double> SelfCapacitanceFarad => [];

    public double Henry(int i, int j) => i != j ? mutual : i == 0 ? first : second;

    public double DcOhm(int section, double temperatureCelsius) => 1e-3;

    public void SeriesOhm(double hz, double temperatureCelsius, Span<double> matrix) => matrix.Clear();

    public IReadOnlyList<Caution> CautionsAt(double hz) => [];
}
