using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>Sections with given inductances (henry) and losses (ohm), the same at every frequency; half the loss at direct current.</summary>
internal sealed record FixedWindings(double[,] Inductance, double[,] Loss, IReadOnlyList<WindingSpan> Spans) : IWindingModel
{
    public int SectionCount => Inductance.GetLength(0);

    public IReadOnlyList<WindingSpan> Windings => Spans;

    public IReadOnlyList<double> SelfCapacitanceFarad => [.. Spans.Select(s => s.SelfCapacitanceFarad)];

    public double Henry(int i, int j) => Inductance[i, j];

    public double DcOhm(int section, double temperatureCelsius) => Loss[section, section] / 2;

    public void SeriesOhm(double hz, double temperatureCelsius, Span<double> matrix)
    {
        for (int i = 0; i < matrix.Length; i++)
        {
            matrix[i] = Loss[i / SectionCount, i % SectionCount];
        }
    }

    public IReadOnlyList<Caution> CautionsAt(double hz) => [];
}
