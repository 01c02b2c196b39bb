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

    // [Medhurst 1947], entries from memory, a few of each region.
    [Theory]
    [InlineData(1.0, 0.0, 5.31)]
    [InlineData(1.0, 0.8, 5.80)]
    [InlineData(0.9, 1.0, 4.10)]
    [InlineData(0.7, 1.0, 2.47)]
    [InlineData(0.6, 2.0, 1.98)]
    [InlineData(0.5, 4.0, 1.78)]
    [InlineData(0.4, 0.4, 1.33)]
    [InlineData(0.8, 10.0, 2.65)]
    [InlineData(0.1, 0.0, 1.02)]
    public void Entries_are_met_exactly(double wireOverPitch, double lengthOverDiameter, double phi) =>
        Assert.Equal(phi, MedhurstTables.ProximityFactor(wireOverPitch, lengthOverDiameter), 1e-12);

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
    // 0.1126 l/D + 0.08 + 0.27/sqrt(l/D), differs from it by up to 8 %.
    [Theory]
    [InlineData(50.0, 5.8)]
    [InlineData(20.0, 2.36)]
    [InlineData(10.0, 1.32)]
    [InlineData(5.0, 0.81)]
    [InlineData(4.0, 0.72)]
    [InlineData(2.0, 0.50)]
    [InlineData(1.0, 0.46)]
    [InlineData(0.8, 0.46)]
    [InlineData(0.5, 0.50)]
    [InlineData(0.25, 0.64)]
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
