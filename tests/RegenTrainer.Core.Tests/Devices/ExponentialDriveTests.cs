using MathNet.Numerics;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Devices;

public class ExponentialDriveTests
{
    private const int Points = 128;

    // kT/q at 25 °C in volt, with the exact constants of the SI of 2019.
    private const double ThermalVolt = 0.025692579;

    // Clarke and Hess, Communication Circuits (1971), ch. 4: exponential device driven by a cosine of x thermal voltages.
    // Columns: x, 2 I1/I0, G_m/g_m, 2 I2/I0, 2 I3/I0, ln I0.
    [Theory]
    [InlineData(0, 0, 1, 0, 0, 0)]
    [InlineData(0.5, 0.485, 0.97, 0.06, 0.00497, 0.06155)]
    [InlineData(1, 0.89278, 0.89278, 0.21444, 0.03502, 0.23591)]
    [InlineData(1.5, 1.19227, 0.79484, 0.41031, 0.0981, 0.49879)]
    [InlineData(2, 1.39555, 0.69777, 0.60445, 0.18665, 0.82399)]
    [InlineData(2.5, 1.52999, 0.612, 0.77601, 0.28839, 1.19084)]
    [InlineData(3, 1.61997, 0.53999, 0.92002, 0.39328, 1.58531)]
    [InlineData(4, 1.72705, 0.43176, 1.13648, 0.59057, 2.42497)]
    [InlineData(5, 1.78677, 0.35735, 1.28529, 0.75853, 3.30468)]
    [InlineData(6, 1.82472, 0.30412, 1.39176, 0.89688, 4.20819)]
    [InlineData(7, 1.85106, 0.26444, 1.47112, 1.01042, 5.12749)]
    [InlineData(8, 1.87047, 0.23381, 1.53238, 1.10428, 6.0581)]
    [InlineData(9, 1.88538, 0.20949, 1.58103, 1.1827, 6.99722)]
    [InlineData(10, 1.8972, 0.18972, 1.62056, 1.24898, 7.94297)]
    [InlineData(12, 1.91476, 0.15956, 1.68087, 1.35447, 9.8495)]
    [InlineData(14, 1.92719, 0.13766, 1.72469, 1.43443, 11.77081)]
    [InlineData(16, 1.93646, 0.12103, 1.75794, 1.49697, 13.70284)]
    [InlineData(18, 1.94363, 0.10798, 1.78404, 1.54717, 15.64303)]
    [InlineData(20, 1.94934, 0.09747, 1.80507, 1.58833, 17.58961)]
    public void Harmonics_of_the_driven_law_are_those_of_the_table(double x, double first, double drive, double second, double third, double lnMean)
    {
        BipolarLaw law = SheetTypes.Bc547b.LawAt(Grade.Typical, 25);
        const double bias = 0.6;
        Span<double> harmonic = stackalloc double[4];
        double conductance = 0;
        for (int k = 0; k < Points; k++)
        {
            double angle = 2 * Math.PI * k / Points;
            double volt = bias + (x * ThermalVolt * Math.Cos(angle));

            // Base and collector tied together keep the collector junction at 0 V: the collector current is the plain exponential.
            TwoPortPoint p = law.Evaluate(volt, volt);
            conductance += (p.G21 + p.G22) / Points * (1 - Math.Cos(2 * angle));
            for (int n = 0; n < harmonic.Length; n++)
            {
                harmonic[n] += (n == 0 ? 1 : 2) * p.I2 * Math.Cos(n * angle) / Points;
            }
        }

        TwoPortPoint rest = law.Evaluate(bias, bias);
        Assert.Equal(first, harmonic[1] / harmonic[0], 5.5e-6);
        Assert.Equal(second, harmonic[2] / harmonic[0], 5.5e-6);
        Assert.Equal(third, harmonic[3] / harmonic[0], 5.5e-6);
        Assert.Equal(lnMean, Math.Log(harmonic[0] / rest.I2), 5.5e-6);

        // By parts, the mean of conductance times 2 sin^2 is the fundamental over the drive.
        Assert.Equal(drive, conductance * ThermalVolt / harmonic[0], 5.5e-6);
    }

    // Abramowitz and Stegun 1964, table 9.8: e^-x I0(x) and e^-x I1(x).
    [Theory]
    [InlineData(0.5, 0.6450352704, 0.1564208032)]
    [InlineData(1, 0.4657596077, 0.2079104154)]
    [InlineData(2, 0.3085083225, 0.2152692892)]
    [InlineData(5, 0.1835408126, 0.1639722669)]
    [InlineData(10, 0.1278333372, 0.1212626814)]
    public void Bessel_functions_of_the_library_are_those_of_the_printed_table(double x, double zeroth, double first)
    {
        Assert.Equal(zeroth, Math.Exp(-x) * SpecialFunctions.BesselI0(x), 1.5e-10);
        Assert.Equal(first, Math.Exp(-x) * SpecialFunctions.BesselI1(x), 1.5e-10);
    }
}
