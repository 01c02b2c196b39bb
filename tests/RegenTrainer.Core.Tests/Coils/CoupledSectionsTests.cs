using CsCheck;
using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class CoupledSectionsTests
{
    // By definition M = k sqrt(L1 L2): 100 and 400 uH at 0.5 have 100 uH; R = w L/Q: 100 uH at Q 100 and 1 MHz have 6.283185 ohm.
    [Fact]
    public void Matrices_follow_the_definitions()
    {
        CoupledSections pair = new(
            [new InductiveSection(100e-6, q: 100.0), new InductiveSection(400e-6, seriesOhm: 7.0)], [new SectionCoupling(1, 0, 0.5)]);
        Assert.Equal(100e-6, pair.Henry(0, 0));
        Assert.Equal(100e-6, pair.Henry(0, 1), 1e-18);
        Assert.Equal(100e-6, pair.Henry(1, 0), 1e-18);
        double[] matrix = new double[4];
        pair.SeriesOhm(1e6, 20.0, matrix);
        Assert.Equal(6.283185307, matrix[0], 1e-9);
        Assert.Equal(0.0, matrix[1]);
        Assert.Equal(7.0, matrix[3], 1e-12);
        Assert.Equal(0.0, pair.DcOhm(0, 20.0));
        Assert.Equal(7.0, pair.DcOhm(1, 60.0));
        Assert.Empty(pair.CautionsAt(1e6));
    }

    // One loss tangent in all of the field leaves its Q in any connection: in series aiding here.
    [Fact]
    public void Sections_of_one_q_keep_it_when_joined()
    {
        CoupledSections pair = new(
            [new InductiveSection(100e-6, q: 80.0), new InductiveSection(300e-6, q: 80.0)], [new SectionCoupling(0, 1, 0.9)]);
        double[] matrix = new double[4];
        pair.SeriesOhm(1e6, 20.0, matrix);
        double henry = pair.Henry(0, 0) + pair.Henry(1, 1) + (2.0 * pair.Henry(0, 1));
        Assert.Equal(80.0, 2.0 * Math.PI * 1e6 * henry / matrix.Sum(), 1e-9);
    }

    // Three sections coupled by one negative factor are possible down to k = -1/2 alone: the matrix has an eigenvalue 1 + 2k.
    [Theory]
    [InlineData(-0.49, true)]
    [InlineData(-0.5, false)]
    [InlineData(-0.6, false)]
    [InlineData(0.99, true)]
    public void Couplings_no_windings_can_have_are_refused(double k, bool possible)
    {
        InductiveSection[] sections = [new(1e-6), new(50e-6), new(300e-6)];
        SectionCoupling[] couplings = [new(0, 1, k), new(0, 2, k), new(1, 2, k)];
        if (possible)
        {
            Assert.Equal(3, new CoupledSections(sections, couplings).SectionCount);
        }
        else
        {
            ArgumentException refused = Assert.Throws<ArgumentException>(() => new CoupledSections(sections, couplings));
            Assert.Contains("positive definite", refused.Message, StringComparison.Ordinal);
        }
    }

    // The inductance factor of a core is defined by L = A_L N² of the whole winding.
    [Fact]
    public void Whole_winding_on_a_core_has_its_inductance_factor() =>
        Gen.Select(Gen.Int[1, 200].Array[1, 5], Gen.Double[0.0, 0.999], Gen.Double[20, 300]).Sample((turns, k, q) =>
        {
            CoupledSections core = CoupledSections.OnCore(60e-9, turns, k, q, 3e-12);
            int all = turns.Sum();
            double[] matrix = new double[turns.Length * turns.Length];
            core.SeriesOhm(1e6, 20.0, matrix);
            double henry = 0.0;
            for (int i = 0; i < turns.Length; i++)
            {
                for (int j = 0; j < turns.Length; j++)
                {
                    henry += core.Henry(i, j);
                }
            }

            Assert.Equal(1.0, henry / (60e-9 * all * all), 1e-12);
            Assert.Equal(q, 2.0 * Math.PI * 1e6 * henry / matrix.Sum(), 1e-9 * q);
            Assert.Equal(3e-12, core.SelfCapacitanceFarad[0]);
            Assert.Equal(all, core.Windings[0].Turns);
        });

    [Fact]
    public void Windings_cover_the_sections_in_order()
    {
        InductiveSection[] sections = [new(1e-6), new(50e-6), new(300e-6)];
        CoupledSections model = new(sections, windings: [new WindingSpan(0, 2, 2e-12, 0.0, 0), new WindingSpan(2, 1, 0.0, 0.0, 0)]);
        Assert.Equal([2e-12, 0.0], model.SelfCapacitanceFarad);
        Assert.Equal(3, new CoupledSections(sections).Windings[0].SectionCount);
        Assert.Throws<ArgumentException>(() => new CoupledSections(sections, windings: [new WindingSpan(0, 2, 0.0, 0.0, 0)]));
        Assert.Throws<ArgumentException>(() => new CoupledSections(
            sections, windings: [new WindingSpan(0, 2, 0.0, 0.0, 0), new WindingSpan(1, 2, 0.0, 0.0, 0)]));
    }

    [Fact]
    public void Faulty_statements_are_refused()
    {
        InductiveSection[] sections = [new(1e-6), new(50e-6)];
        Assert.Throws<ArgumentException>(() => new CoupledSections([]));
        Assert.Throws<ArgumentException>(() => new CoupledSections(sections, [new SectionCoupling(0, 2, 0.1)]));
        Assert.Throws<ArgumentException>(
            () => new CoupledSections(sections, [new SectionCoupling(0, 1, 0.1), new SectionCoupling(1, 0, 0.1)]));
        Assert.Throws<ArgumentException>(() => new SectionCoupling(1, 1, 0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new SectionCoupling(0, 1, 1.0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new InductiveSection(0.0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new InductiveSection(1e-6, q: -1.0));
        Assert.Throws<ArgumentException>(() => new CoupledSections(sections).SeriesOhm(1e6, 20.0, new double[3]));
    }
}
