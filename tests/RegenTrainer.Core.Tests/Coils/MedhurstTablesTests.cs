using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class MedhurstTablesTests
{
    // Exact high-frequency loss of an endless array of round wires, H = I/s inside and none outside (multipole expansion,
    // computed independently).
    [Theory]
    [InlineData(0.1, 1.04868)]
    [InlineData(0.2, 1.18718)]
    [InlineData(0.3, 1.39592)]
    [InlineData(0.4, 1.65066)]
    [InlineData(0.5, 1.93014)]
    [InlineData(0.6, 2.22045)]
    [InlineData(0.7, 2.51503)]
    [InlineData(0.8, 2.81179)]
    [InlineData(0.9, 3.11026)]
    public void Endless_coil_agrees_with_the_field_solution(double wireOverPitch, double exact) =>
        Assert.Equal(exact, MedhurstTables.ProximityFactor(wireOverPitch, double.PositiveInfinity), 0.01);

    // Thin wires, Phi = 1 + C (d/s)² [Butterworth 1925], C from the field of 400 turns by elliptic integrals (independent).
    [Theory]
    [InlineData(0.0, 1.645)]
    [InlineData(0.2, 1.786)]
    [InlineData(0.4, 2.006)]
    [InlineData(0.6, 2.220)]
    [InlineData(0.8, 2.417)]
    [InlineData(1.0, 2.594)]
    [InlineData(2.0, 3.225)]
    [InlineData(4.0, 3.775)]
    [InlineData(6.0, 3.974)]
    [InlineData(8.0, 4.050)]
    [InlineData(10.0, 4.072)]
    [InlineData(double.PositiveInfinity, 4.935)]
    public void Thin_wires_follow_the_mean_square_field(double lengthOverDiameter, double c)
    {
        Assert.Equal(1.0 + (0.01 * c), MedhurstTables.ProximityFactor(0.1, lengthOverDiameter), 0.013);
        Assert.Equal(1.0 + (0.04 * c), MedhurstTables.ProximityFactor(0.2, lengthOverDiameter), 0.013);
    }

    // [Medhurst 1947], all entries, from memory; columns l/D = 0, 0.2, 0.4, 0.6, 0.8, 1, 2, 4, 6, 8, 10 and endless.
    [Theory]
    [InlineData(1.0, new[] { 5.31, 5.45, 5.65, 5.8, 5.8, 5.55, 4.1, 3.54, 3.31, 3.2, 3.23, 3.41 })]
    [InlineData(0.9, new[] { 3.73, 3.84, 3.99, 4.11, 4.17, 4.1, 3.36, 3.05, 2.92, 2.9, 2.93, 3.11 })]
    [InlineData(0.8, new[] { 2.74, 2.83, 2.97, 3.1, 3.2, 3.17, 2.74, 2.6, 2.6, 2.62, 2.65, 2.81 })]
    [InlineData(0.7, new[] { 2.12, 2.2, 2.28, 2.38, 2.44, 2.47, 2.32, 2.27, 2.29, 2.34, 2.37, 2.51 })]
    [InlineData(0.6, new[] { 1.74, 1.77, 1.83, 1.89, 1.92, 1.94, 1.98, 2.01, 2.03, 2.08, 2.1, 2.22 })]
    [InlineData(0.5, new[] { 1.44, 1.48, 1.54, 1.6, 1.64, 1.67, 1.74, 1.78, 1.8, 1.81, 1.83, 1.93 })]
    [InlineData(0.4, new[] { 1.26, 1.29, 1.33, 1.38, 1.42, 1.45, 1.5, 1.54, 1.56, 1.57, 1.58, 1.65 })]
    [InlineData(0.3, new[] { 1.16, 1.19, 1.21, 1.22, 1.23, 1.24, 1.28, 1.32, 1.34, 1.34, 1.35, 1.4 })]
    [InlineData(0.2, new[] { 1.07, 1.08, 1.08, 1.1, 1.1, 1.1, 1.13, 1.15, 1.16, 1.16, 1.17, 1.19 })]
    [InlineData(0.1, new[] { 1.02, 1.02, 1.03, 1.03, 1.03, 1.03, 1.04, 1.04, 1.04, 1.04, 1.04, 1.05 })]
    public void Entries_are_met_exactly(double wireOverPitch, double[] row)
    {
        double[] lengths = [0.0, 0.2, 0.4, 0.6, 0.8, 1.0, 2.0, 4.0, 6.0, 8.0, 10.0, double.PositiveInfinity];
        Assert.Equal(lengths.Length, row.Length);
        Assert.All(lengths.Zip(row), entry => Assert.Equal(entry.Second, MedhurstTables.ProximityFactor(wireOverPitch, entry.First), 1e-12));
    }

    // Half way between four entries, by hand: (1.74 + 1.78 + 1.98 + 2.01)/4.
    [Fact]
    public void Between_entries_the_table_is_linear() =>
        Assert.Equal(1.8775, MedhurstTables.ProximityFactor(0.55, 3.0), 1e-12);

    // From 10 to endless linear in D/l: at 20 half way between 1.83 and 1.93.
    [Fact]
    public void Beyond_ten_the_table_goes_on_to_the_endless_coil()
    {
        Assert.Equal(1.88, MedhurstTables.ProximityFactor(0.5, 20.0), 1e-12);
        Assert.Equal(1.83, MedhurstTables.ProximityFactor(0.5, 10.0 + 1e-9), 1e-9);
        Assert.Equal(1.93, MedhurstTables.ProximityFactor(0.5, 1e12), 1e-9);
    }

    [Fact]
    public void Wider_pitch_than_the_table_takes_its_edge() =>
        Assert.Equal(1.04, MedhurstTables.ProximityFactor(0.02, 2.0), 1e-12);

    // [Medhurst 1947] self-capacitance in pF of a coil one cm wide (from memory). The other remembered form,
    // 0.1126 l/D + 0.08 + 0.27/sqrt(l/D), differs from it by up to 8 %, in both directions.
    [Theory]
    [InlineData(50.0, 5.8)]
    [InlineData(40.0, 4.6)]
    [InlineData(30.0, 3.4)]
    [InlineData(25.0, 2.9)]
    [InlineData(20.0, 2.36)]
    [InlineData(15.0, 1.86)]
    [InlineData(10.0, 1.32)]
    [InlineData(9.0, 1.22)]
    [InlineData(8.0, 1.12)]
    [InlineData(7.0, 1.01)]
    [InlineData(6.0, 0.92)]
    [InlineData(5.0, 0.81)]
    [InlineData(4.5, 0.77)]
    [InlineData(4.0, 0.72)]
    [InlineData(3.5, 0.67)]
    [InlineData(3.0, 0.61)]
    [InlineData(2.5, 0.56)]
    [InlineData(2.0, 0.5)]
    [InlineData(1.5, 0.47)]
    [InlineData(1.0, 0.46)]
    [InlineData(0.9, 0.46)]
    [InlineData(0.8, 0.46)]
    [InlineData(0.7, 0.47)]
    [InlineData(0.6, 0.48)]
    [InlineData(0.5, 0.5)]
    [InlineData(0.45, 0.52)]
    [InlineData(0.4, 0.54)]
    [InlineData(0.35, 0.57)]
    [InlineData(0.3, 0.6)]
    [InlineData(0.25, 0.64)]
    [InlineData(0.2, 0.7)]
    [InlineData(0.15, 0.79)]
    [InlineData(0.1, 0.96)]
    public void Self_capacitance_agrees_with_both_published_forms(double lengthOverDiameter, double picofarad)
    {
        double farad = MedhurstTables.SelfCapacitanceFarad(lengthOverDiameter, 0.01);
        double fit = (0.1126 * lengthOverDiameter) + 0.08 + (0.27 / Math.Sqrt(lengthOverDiameter));
        Assert.Equal(picofarad * 1e-12, farad, 1e-20);
        Assert.Equal(1.0, farad / (fit * 1e-12), 0.09);
    }

    // A slip in one entry would stand out: every interval stays within 9 % of the fitted form.
    [Fact]
    public void Self_capacitance_has_no_outlier()
    {
        for (double ratio = 0.1; ratio <= 50.0; ratio *= 1.02)
        {
            double fit = (0.1126 * ratio) + 0.08 + (0.27 / Math.Sqrt(ratio));
            Assert.InRange(MedhurstTables.SelfCapacitanceFarad(ratio, 0.01) / (fit * 1e-12), 0.91, 1.09);
        }
    }

    [Fact]
    public void Outside_its_range_self_capacitance_keeps_the_edge()
    {
        Assert.Equal(5 * 0.96e-12, MedhurstTables.SelfCapacitanceFarad(0.02, 0.05), 1e-20);
        Assert.Equal(5 * 5.8e-12, MedhurstTables.SelfCapacitanceFarad(90.0, 0.05), 1e-20);
    }

    [Theory]
    [InlineData(0.0, 1.0)]
    [InlineData(1.1, 1.0)]
    [InlineData(0.5, -1.0)]
    [InlineData(0.5, double.NaN)]
    public void Impossible_shapes_are_refused(double wireOverPitch, double lengthOverDiameter) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => MedhurstTables.ProximityFactor(wireOverPitch, lengthOverDiameter));
}
