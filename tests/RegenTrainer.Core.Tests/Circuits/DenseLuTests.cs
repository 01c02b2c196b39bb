using MathNet.Numerics.LinearAlgebra;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Tests.Oracles;

namespace RegenTrainer.Core.Tests.Circuits;

public sealed class DenseLuTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(7)]
    [InlineData(64)]
    [InlineData(129)]
    public void Solves_what_a_general_library_solves(int n)
    {
        var random = new CounterRandom(n);
        double[] a = [.. Enumerable.Range(0, n * n).Select(_ => random.NextSigned())];
        double[] b = [.. Enumerable.Range(0, n).Select(_ => random.NextSigned())];
        a[0] = 0;   // an exchange of rows is wanted from the start
        if (n == 1)
        {
            a[0] = 2;
        }

        double[] expected = [.. Matrix<double>.Build.DenseOfRowMajor(n, n, a).Solve(Vector<double>.Build.Dense([.. b]))];
        Assert.True(DenseLu.TrySolve(a, b));
        Assert.All(expected.Zip(b), pair => Assert.Equal(pair.First, pair.Second, 1e-9 * (1 + Math.Abs(pair.First))));
    }

    [Fact]
    public void Refuses_what_is_singular_or_not_finite()
    {
        Assert.False(DenseLu.TrySolve([1, 2, 2, 4], [1, 1]));
        Assert.False(DenseLu.TrySolve([double.NaN, 1, 1, 1], [1, 1]));
    }
}
