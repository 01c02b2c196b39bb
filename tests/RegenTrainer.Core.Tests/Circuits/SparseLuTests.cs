using System.Numerics;
using MathNet.Numerics.LinearAlgebra;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Tests.Oracles;

namespace RegenTrainer.Core.Tests.Circuits;

/// <summary>The elimination against the general-purpose library MathNet.Numerics 5.0.0 (dense LU).</summary>
public sealed class SparseLuTests
{
    [Fact]
    public void Complex_solutions_equal_those_of_the_reference_library()
    {
        for (int seed = 1; seed <= 200; seed++)
        {
            var random = new CounterRandom(seed);
            (int n, int[] rows, int[] columns) = Pattern(random);
            Complex[] entries = [.. rows.Select(_ => new Complex(random.NextSigned(), random.NextSigned()))];
            var dense = Matrix<Complex>.Build.Dense(n, n);
            for (int k = 0; k < rows.Length; k++)
            {
                dense[rows[k], columns[k]] = entries[k];
            }

            Complex[] right = [.. Enumerable.Range(0, n).Select(_ => new Complex(random.NextSigned(), random.NextSigned()))];
            Complex[] x = [.. right], xt = [.. right];
            var lu = new SparseLu<Complex>(n, rows, columns);
            Assert.True(lu.TryFactor(entries, out _));
            Complex[] again = [.. right];
            lu.Solve(x);
            lu.SolveBoth(again, xt);
            Assert.Equal(x, again);
            AssertClose(dense.Solve(MathNet.Numerics.LinearAlgebra.Vector<Complex>.Build.DenseOfArray(right)).ToArray(), x, seed);
            AssertClose(dense.Transpose().Solve(MathNet.Numerics.LinearAlgebra.Vector<Complex>.Build.DenseOfArray(right)).ToArray(), xt, seed);
        }
    }

    [Fact]
    public void Real_solutions_equal_those_of_the_reference_library()
    {
        for (int seed = 1; seed <= 200; seed++)
        {
            var random = new CounterRandom(1000 + seed);
            (int n, int[] rows, int[] columns) = Pattern(random);
            double[] entries = [.. rows.Select(_ => random.NextSigned())];
            var dense = Matrix<double>.Build.Dense(n, n);
            for (int k = 0; k < rows.Length; k++)
            {
                dense[rows[k], columns[k]] = entries[k];
            }

            double[] right = [.. Enumerable.Range(0, n).Select(_ => random.NextSigned())];
            double[] x = [.. right];
            var lu = new SparseLu<double>(n, rows, columns);
            Assert.True(lu.TryFactor(entries, out _));
            lu.Solve(x);
            double[] expected = dense.Solve(MathNet.Numerics.LinearAlgebra.Vector<double>.Build.DenseOfArray(right)).ToArray();
            double scale = expected.Max(Math.Abs);
            Assert.All(Enumerable.Range(0, n), i => Assert.True(Math.Abs(expected[i] - x[i]) <= 1e-9 * scale, $"seed {seed}"));
        }
    }

    [Fact]
    public void Values_that_do_not_suit_the_plan_get_one_of_their_own()
    {
        int[] rows = [0, 0, 1, 1], columns = [0, 1, 0, 1];
        var lu = new SparseLu<double>(2, rows, columns);
        Assert.True(lu.TryFactor([1, 0.5, 0.5, 1], out _));
        Assert.True(lu.TryFactor([1e-14, 1, 1, 0], out _));
        double[] x = [1, 2];
        lu.Solve(x);
        Assert.Equal(2, x[0], 12);
        Assert.Equal(1, x[1], 12);
    }

    [Fact]
    public void A_singular_matrix_is_told_with_its_place()
    {
        int[] rows = [0, 0, 1, 1, 2], columns = [0, 1, 0, 1, 2];
        var lu = new SparseLu<double>(3, rows, columns);
        Assert.False(lu.TryFactor([1, 2, 3, 4, 0], out int blamed));
        Assert.Equal(2, blamed);
        Assert.False(lu.TryFactor([1, 2, double.NaN, 4, 1], out blamed));
        Assert.Equal(0, blamed);
    }

    [Fact]
    public void Factoring_and_solving_allocate_nothing()
    {
        var random = new CounterRandom(5);
        (int n, int[] rows, int[] columns) = Pattern(random);
        Complex[] entries = [.. rows.Select(_ => new Complex(random.NextSigned(), random.NextSigned()))];
        Complex[] x = new Complex[n], z = new Complex[n];
        var lu = new SparseLu<Complex>(n, rows, columns);
        for (int k = 0; k < 100; k++)
        {
            lu.TryFactor(entries, out _);
            x[0] = 1;
            lu.Solve(x);
            lu.SolveBoth(x, z);
        }

        long before = GC.GetAllocatedBytesForCurrentThread();
        lu.TryFactor(entries, out _);
        lu.Solve(x);
        lu.SolveBoth(x, z);
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
    }

    private static void AssertClose(Complex[] expected, Complex[] actual, int seed)
    {
        double scale = expected.Max(Complex.Abs);
        Assert.All(Enumerable.Range(0, expected.Length), i => Assert.True(Complex.Abs(expected[i] - actual[i]) <= 1e-9 * scale, $"seed {seed}"));
    }

    private static (int Size, int[] Rows, int[] Columns) Pattern(CounterRandom random)
    {
        int n = 3 + (int)(random.Next() * 20);
        var places = new HashSet<(int, int)>();
        for (int i = 0; i < n; i++)
        {
            places.Add((i, i));
            for (int k = 0; k < 3; k++)
            {
                places.Add((i, (int)(random.Next() * n)));
            }
        }

        return (n, [.. places.Select(p => p.Item1)], [.. places.Select(p => p.Item2)]);
    }
}
