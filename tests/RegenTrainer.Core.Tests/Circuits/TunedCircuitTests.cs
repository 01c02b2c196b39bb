using System.Numerics;
using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Core.Tests.Circuits;

/// <summary>Tuned circuits against the handbooks: each check names its source.</summary>
public sealed class TunedCircuitTests
{
    private const double Henry = 250e-6;
    private const double Farad = 100e-12;

    // LC = 25330.3 / f^2 (uH, pF, MHz): Terman, Radio Engineers' Handbook (1943), constant 25330; 250 uH with 100 pF: 1.006584 MHz.
    [Fact]
    public void Resonance_of_250_microhenry_and_100_picofarad()
    {
        ModeResult mode = Ring(Tank(Henry, Farad, q: 1e6));
        Assert.Equal(1.006584e6, mode.Hz, 0.6);
        Assert.Equal(25330.3, Henry * 1e6 * (Farad * 1e12) * Math.Pow(mode.Hz / 1e6, 2), 0.05);
    }

    // R dynamic = Q w L = 158 113.9 ohm for 250 uH, Q = 100 at 1.006584 MHz: textbook (Terman). A series loss moves it by 1/Q^2.
    [Fact]
    public void Dynamic_resistance_of_a_tank()
    {
        Workspace w = NetworkPropertyTests.At(Tank(Henry, Farad, 100), 1.006584e6);
        Assert.True(ResponseSolver.TryImpedance(w, w.Network.NodeIndex("top"), -1, new Complex(0, 2 * Math.PI * 1.006584e6), out Complex z));
        Assert.Equal(158113.9, Complex.Abs(z), 158113.9 * 2e-4);
    }

    // Universal resonance curve: Terman, Radio Engineers' Handbook (1943) sec. 3; columns a = Q (f - f0)/f0, |A/A0|, phase in degrees.
    [Theory]
    [InlineData(0.25, 0.89443, 26.565)]
    [InlineData(0.5, 0.70711, 45.0)]
    [InlineData(0.75, 0.5547, 56.31)]
    [InlineData(1, 0.44721, 63.435)]
    [InlineData(1.5, 0.31623, 71.565)]
    [InlineData(2, 0.24254, 75.964)]
    [InlineData(3, 0.1644, 80.538)]
    [InlineData(4, 0.12403, 82.875)]
    [InlineData(5, 0.0995, 84.289)]
    [InlineData(10, 0.04994, 87.138)]
    public void Universal_resonance_curve(double a, double ratio, double phaseDegrees)
    {
        // The curve is the limit of high Q: f - f0 small against f0.
        const double q = 50_000;
        Func<double, Complex> z = ParallelTank(1e6, q);
        Complex relative = z(1e6 * (1 + (a / q))) / z(1e6);
        Assert.Equal(ratio, Complex.Abs(relative), ratio * 2e-4);
        Assert.Equal(-phaseDegrees, relative.Phase * 180 / Math.PI, 0.02);
    }

    // Upper-sideband loss of one tuned circuit at 1 MHz in dB, 1/sqrt(1 + Q^2 (f/f0 - f0/f)^2): computed in the check table.
    [Theory]
    [InlineData(50, -0.043, -0.373, -0.965, -2.989)]
    [InlineData(100, -0.17, -1.332, -2.999, -6.955)]
    [InlineData(200, -0.644, -3.866, -6.972, -12.264)]
    [InlineData(500, -3.008, -9.988, -14.129, -20.001)]
    [InlineData(1000, -6.986, -15.669, -20.022, -25.988)]
    public void Upper_sideband_loss(double q, double at1k, double at3k, double at5k, double at10k)
    {
        Func<double, Complex> z = ParallelTank(1e6, q);
        double Loss(double offset) => 20 * Math.Log10(Complex.Abs(z(1e6 + offset)) / Complex.Abs(z(1e6)));
        Assert.Equal(at1k, Loss(1e3), 0.001);
        Assert.Equal(at3k, Loss(3e3), 0.001);
        Assert.Equal(at5k, Loss(5e3), 0.001);
        Assert.Equal(at10k, Loss(10e3), 0.001);
    }

    // B = f0/Q and f_upper f_lower = f0^2, exact for a parallel tank: any textbook (Terman).
    [Fact]
    public void Bandwidth_and_geometric_symmetry()
    {
        Func<double, Complex> z = ParallelTank(1e6, 25);
        double Half(double hz) => Complex.Abs(z(hz)) - (Complex.Abs(z(1e6)) / Math.Sqrt(2));
        (double lower, double upper) = (Bisect(Half, 0.8e6, 1e6), Bisect(Half, 1e6, 1.2e6));
        Assert.Equal(1e6 / 25, upper - lower, 0.01);
        Assert.Equal(1e12, lower * upper, 1e12 * 1e-9);
    }

    // Shrinkage of n equal stages, sqrt(2^(1/n) - 1): Valley and Wallman, Vacuum Tube Amplifiers (1948).
    [Theory]
    [InlineData(1, 1.0)]
    [InlineData(2, 0.64359)]
    [InlineData(3, 0.50982)]
    [InlineData(4, 0.43498)]
    [InlineData(5, 0.38561)]
    [InlineData(6, 0.34995)]
    public void Bandwidth_shrinks_with_equal_stages(int stages, double factor)
    {
        Func<double, Complex> z = ParallelTank(1e6, 100);
        double Half(double hz) => Math.Pow(Complex.Abs(z(hz)) / Complex.Abs(z(1e6)), stages) - (1 / Math.Sqrt(2));
        double width = Bisect(Half, 1e6, 1.05e6) - Bisect(Half, 0.95e6, 1e6);
        Assert.Equal(factor * 1e4, width, 0.5);
    }

    // Two equal coupled circuits: Aiken, Proc. IRE 25, 230 (1937); s = kQ, v = 2 Q df/f0: centre and peak relative to critical, v of peak and outer 3 dB edge.
    [Theory]
    [InlineData(0.5, 0.8, 0.8, 0.0, 0.84127)]
    [InlineData(1, 1.0, 1.0, 0.0, 1.41421)]
    [InlineData(1.5, 0.92308, 1.0, 1.11803, 2.06155)]
    [InlineData(2, 0.8, 1.0, 1.73205, 2.64575)]
    [InlineData(2.41421, 0.70711, 1.0, 2.19737, 3.10755)]
    public void Two_coupled_circuits(double s, double centre, double peak, double peakAt, double edgeAt)
    {
        const double q = 20_000;
        Func<double, double> critical = CoupledPair(1, q), pair = CoupledPair(s, q);
        double unit = critical(0);
        Assert.Equal(centre, pair(0) / unit, 2e-3);
        (double at, double value) = Enumerable.Range(0, 4001).Select(i => i / 1000.0).Select(v => (v, pair(v) / unit)).MaxBy(p => p.Item2);
        Assert.Equal(peak, value, 2e-3);
        Assert.Equal(peakAt, at, s == 1 ? 0.1 : 0.01);
        Assert.Equal(edgeAt, Bisect(v => (pair(v) / unit) - (value / Math.Sqrt(2)), at, 6), 0.01);
    }

    // Capacitive tap C1 = 100 pF, C2 = 900 pF, 1 kohm across C2, 1 MHz: parallel resistance 102 533.03 ohm, equivalent C 90.247 pF: exact admittance; method Clarke and Hess (1971) ch. 2.
    [Fact]
    public void Capacitive_tap()
    {
        Workspace w = NetworkPropertyTests.At(
            [new Capacitor("C1", "top", "tap", 100e-12), new Capacitor("C2", "tap", Part.Earth, 900e-12), new Resistor("load", "tap", Part.Earth, 1000)], 1e6);
        Assert.True(ResponseSolver.TryImpedance(w, w.Network.NodeIndex("top"), -1, new Complex(0, 2 * Math.PI * 1e6), out Complex z));
        Complex y = 1 / z;
        Assert.Equal(102533.03, 1 / y.Real, 0.05);
        Assert.Equal(90.247e-12, y.Imaginary / (2 * Math.PI * 1e6), 1e-15);
    }

    // Inductive tap at unity coupling transforms by (N/n)^2: any textbook. Coupling 0.999999 comes within 0.01 %.
    [Fact]
    public void Inductive_tap()
    {
        const double turns = 10, tap = 2, k = 0.999999;
        double l1 = tap * tap * 1e-6, l2 = (turns - tap) * (turns - tap) * 1e-6;
        var coil = new Windings("coil", [(Part.Earth, "tap"), ("tap", "top")], new SectionPair(l1, l2, k * Math.Sqrt(l1 * l2)));
        Workspace w = NetworkPropertyTests.At([coil, new Resistor("load", "tap", Part.Earth, 1000)], 100e6);
        Assert.True(ResponseSolver.TryImpedance(w, w.Network.NodeIndex("top"), -1, new Complex(0, 2 * Math.PI * 100e6), out Complex z));
        Assert.Equal(25_000, 1 / (1 / z).Real, 25_000 * 1e-3);
    }

    // tau = 2Q/w0 = 318.31 us and 1/e in Q/pi = 318.31 cycles for f0 = 1 MHz, Q = 1000: textbook.
    [Fact]
    public void Ring_time()
    {
        double farad = 1 / (Math.Pow(2 * Math.PI * 1e6, 2) * Henry);
        ModeResult mode = Ring(Tank(Henry, farad, 1000));
        Assert.Equal(318.31e-6, -1 / mode.S.Real, 0.01e-6);
        Assert.Equal(318.31, -mode.Hz / mode.S.Real, 0.01);
    }

    // Q_eff = Q/(1 - T): Landon and Jarvis, Proc. IRE 13, 709 (1925); Q = 200, T = 0.95 gives 4000, and 1 % of loop gain then moves Q by 19 %.
    [Fact]
    public void Regeneration_multiplies_q()
    {
        double Q(double t)
        {
            // A parallel conductance carries all the loss, so that the feedback conductance is exactly T times it.
            double conductance = 2 * Math.PI * 1e6 * Farad / 200;
            IReadOnlyList<Part> parts =
            [
                new Inductor("coil", "top", Part.Earth, 1 / (Math.Pow(2 * Math.PI * 1e6, 2) * Farad)),
                new Capacitor("tuning", "top", Part.Earth, Farad), new Resistor("loss", "top", Part.Earth, 1 / conductance),
                new Feedback("feedback", "top", Part.Earth, Part.Earth, "top", conductance, t),
            ];
            return Ring(parts).Q;
        }

        Assert.Equal(200, Q(0), 0.01);
        Assert.Equal(4000, Q(0.95), 1);
        Assert.Equal(19, (Q(0.95 * 1.0001) - Q(0.95 * 0.9999)) / Q(0.95) / 0.0002, 0.1);
    }

    // IRE standard dummy antenna, 200 pF in series with 20 uH parallel to 400 ohm + 400 pF: IRE Standards on Radio Receivers (1948); impedance computed in the check table.
    [Theory]
    [InlineData(530e3, 2.825, -1430.028)]
    [InlineData(1e6, 26.982, -651.748)]
    [InlineData(1.6e6, 99.653, -284.434)]
    [InlineData(5e6, 342.459, -0.64)]
    [InlineData(10e6, 384.986, 5.885)]
    [InlineData(20e6, 396.212, 3.72)]
    public void Standard_dummy_antenna(double hz, double ohm, double reactance)
    {
        Workspace w = NetworkPropertyTests.At(
            [
                new Capacitor("series", "end", "middle", 200e-12), new Inductor("coil", "middle", Part.Earth, 20e-6),
                new Resistor("damping", "middle", "inner", 400), new Capacitor("parallel", "inner", Part.Earth, 400e-12),
            ],
            hz);
        Assert.True(ResponseSolver.TryImpedance(w, w.Network.NodeIndex("end"), -1, new Complex(0, 2 * Math.PI * hz), out Complex z));
        Assert.Equal(ohm, z.Real, 0.001);
        Assert.Equal(reactance, z.Imaginary, 0.001);
    }

    private static IReadOnlyList<Part> Tank(double henry, double farad, double q) =>
        [new Inductor("coil", "top", Part.Earth, henry, 0, q), new Capacitor("tuning", "top", Part.Earth, farad)];

    private static ModeResult Ring(IReadOnlyList<Part> parts)
    {
        Workspace w = NetworkPropertyTests.At(parts, 1e6);
        SpectralMode mode = ModeSpectrum.TryFind(w, 2 * Math.PI * 1e6)!.MaxBy(m => m.S.Imaginary)!;
        w = NetworkPropertyTests.At(parts, mode.S.Imaginary / (2 * Math.PI));
        mode.Shape.CopyTo(w.Shape, 0);
        mode.Shape.CopyTo(w.LeftShape, 0);
        return ModeSolver.Polish(w, mode.S, 0, null);
    }

    /// <summary>The impedance of a tank whose loss is a resistor in parallel, as the formulas assume.</summary>
    private static Func<double, Complex> ParallelTank(double hz, double q)
    {
        double henry = 1 / (Math.Pow(2 * Math.PI * hz, 2) * Farad);
        Workspace w = NetworkPropertyTests.At(
            [
                new Inductor("coil", "top", Part.Earth, henry), new Capacitor("tuning", "top", Part.Earth, Farad),
                new Resistor("loss", "top", Part.Earth, q / (2 * Math.PI * hz * Farad)),
            ],
            hz);
        return f => ResponseSolver.TryImpedance(w, w.Network.NodeIndex("top"), -1, new Complex(0, 2 * Math.PI * f), out Complex z) ? z : Complex.Zero;
    }

    /// <summary>Secondary current of two equal series circuits against v = 2 Q df/f0.</summary>
    private static Func<double, double> CoupledPair(double s, double q)
    {
        double henry = 1 / (Math.Pow(2 * Math.PI * 1e6, 2) * Farad), ohm = 2 * Math.PI * 1e6 * henry / q;
        Workspace w = NetworkPropertyTests.At(
            [
                new Antenna("source", "a", Part.Earth), new Capacitor("first", "a", "b", Farad), new Resistor("first loss", "b", "c", ohm),
                new Windings("coils", [("c", Part.Earth), ("d", Part.Earth)], new SectionPair(henry, henry, s / q * henry)),
                new Resistor("second loss", "d", "out", ohm), new Capacitor("second", "out", Part.Earth, Farad),
            ],
            1e6);
        return v => ResponseSolver.TryAt(w, w.Network.NodeIndex("out"), 1e6 * (1 + (v / (2 * q))), out Complex h) ? Complex.Abs(h) : 0;
    }

    private static double Bisect(Func<double, double> f, double a, double b)
    {
        bool rising = f(b) > 0;
        for (int k = 0; k < 200; k++)
        {
            double middle = 0.5 * (a + b);
            (a, b) = f(middle) > 0 == rising ? (a, middle) : (middle, b);
        }

        return 0.5 * (a + b);
    }
}
