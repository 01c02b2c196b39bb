using System.Numerics;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// One settled cycle of a stage that its antenna drives at one frequency: the linear part meets the devices' full laws harmonic by
/// harmonic, bias shift and everything the network does to harmonics included (piecewise harmonic balance [Nakhla and Vlach 1976]),
/// by Newton's method on the port voltages in time.
/// </summary>
public sealed class DrivenCycle
{
    /// <summary>Points of the cycle; harmonics up to one below half of them are carried.</summary>
    private const int Points = 32;

    private const int Harmonics = (Points / 2) - 1;

    /// <summary>The waveform is looked at this many times as finely as it is solved.</summary>
    private const int FinePoints = 8 * Points;

    private const int StepLimit = 30;

    /// <summary>A Newton step below this many volt ends the search.</summary>
    private const double VoltTolerance = 1e-8;

    private static readonly Complex[] _turns =
        [.. Enumerable.Range(0, FinePoints).Select(k => Complex.FromPolarCoordinates(1, 2 * Math.PI * k / FinePoints))];

    private readonly IDeviceLaw[] _laws;
    private readonly TwoPortPoint[] _rest;
    private readonly double[] _restVolt;
    private readonly PortResponses _network;
    private readonly double _omega;
    private readonly int _ports;
    private readonly double[] _byCurrent;
    private readonly double[] _byCharge;
    private readonly double[] _volt;
    private readonly double[] _tried;
    private readonly double[] _step;
    private readonly double[] _current;
    private readonly double[] _charge;
    private readonly TwoPortPoint[] _points;
    private readonly double[] _matrix;

    private DrivenCycle(Workspace w, double hz, PortResponses network)
    {
        (_network, _omega, _ports) = (network, 2 * Math.PI * hz, 2 * w.Network.Devices.Count);
        _laws = [.. Enumerable.Range(0, _ports / 2).Select(w.Values.Law)];
        _rest = [.. w.Points];
        _restVolt = [.. Enumerable.Range(0, _ports).Select(p => p % 2 == 0 ? w.Port1[p / 2] : w.Port2[p / 2])];
        int unknowns = _ports * Points;
        (_byCurrent, _byCharge) = (new double[_ports * unknowns], new double[_ports * unknowns]);
        (_volt, _tried, _step) = (new double[unknowns], new double[unknowns], new double[unknowns]);
        (_current, _charge, _points) = (new double[unknowns], new double[unknowns], new TwoPortPoint[unknowns / 2]);
        _matrix = new double[unknowns * unknowns];
        FillKernels();
    }

    /// <summary>Amplitude of the electromotive force of the last cycle solved, in volt.</summary>
    public double AntennaVolt { get; private set; }

    /// <summary>Prepares cycles of the stage in the workspace.</summary>
    /// <param name="w">Workspace with pencil and operating point of the setting, the latter as its last Newton step left it.</param>
    /// <param name="outputIndex">Unknown of the output; -1 for earth.</param>
    /// <param name="hz">Frequency of the drive in Hz, above 0.</param>
    /// <returns>The cycle at rest; null without a device or where the network is singular.</returns>
    public static DrivenCycle? TryPrepare(Workspace w, int outputIndex, double hz) =>
        w.Network.Devices.Count > 0 && PortResponses.TryFind(w, outputIndex, hz, Harmonics) is { } network
            ? new DrivenCycle(w, hz, network)
            : null;

    /// <summary>Solves the cycle at an amplitude of the antenna's electromotive force, from the last one solved.</summary>
    /// <param name="antennaVolt">Amplitude in volt, above 0.</param>
    /// <returns>Whether it was found; if not, the last cycle stands.</returns>
    public bool TrySolve(double antennaVolt)
    {
        double grown = AntennaVolt > 0 ? antennaVolt / AntennaVolt : 0;
        for (int i = 0; i < _volt.Length; i++)
        {
            _tried[i] = AntennaVolt > 0 ? grown * _volt[i] : Linear(i, antennaVolt);
        }

        for (int step = 0; step < StepLimit; step++)
        {
            Evaluate(_tried);
            if (!TryStep(antennaVolt, out double largest))
            {
                return false;
            }

            if (largest < VoltTolerance)
            {
                _tried.CopyTo(_volt, 0);
                Evaluate(_volt);
                AntennaVolt = antennaVolt;
                return true;
            }
        }

        return false;
    }

    /// <summary>The least collector current of the last cycle, as a share of that at rest.</summary>
    /// <param name="device">Index of the device.</param>
    public double LeastCurrentShare(int device) => Least(device, (v1, v2) => _laws[device].Conduct(v1, v2).I2 / _rest[device].I2);

    /// <summary>The least voltage between output and common of the last cycle, in volt, in the device's forward direction.</summary>
    /// <param name="device">Index of the device.</param>
    public double LeastOutputVolt(int device) => Least(device, (_, v2) => Math.Sign(_rest[device].I2) * v2);

    /// <summary>Amplitudes of the fundamental across the tuning capacitor and at the output, in volt.</summary>
    public (double Tank, double Output) Amplitudes()
    {
        (Complex tank, Complex output) = (AntennaVolt * _network.TankFromAntenna, AntennaVolt * _network.OutputFromAntenna);
        for (int q = 0; q < _ports; q++)
        {
            Complex drawn = Phasor(_current, q, 1) + (new Complex(0, _omega) * Phasor(_charge, q, 1));
            tank -= drawn * _network.TankFromPort[q];
            output -= drawn * _network.OutputFromPort[q];
        }

        return (Complex.Abs(tank), Complex.Abs(output));
    }

    /// <summary>
    /// What small signals predict for a device at 1 V of electromotive force: amplitudes of its collector current in ampere and of
    /// its output voltage in volt.
    /// </summary>
    /// <param name="device">Index of the device.</param>
    public (double Ampere, double Volt) SmallSignal(int device)
    {
        (Complex v1, Complex v2) = (_network.FromAntenna[2 * device], _network.FromAntenna[(2 * device) + 1]);
        return (Complex.Abs((_rest[device].G21 * v1) + (_rest[device].G22 * v2)), Complex.Abs(v2));
    }

    private double Least(int device, Func<double, double, double> value)
    {
        double least = double.PositiveInfinity;
        Span<Complex> first = stackalloc Complex[Harmonics + 1], second = stackalloc Complex[Harmonics + 1];
        for (int k = 0; k <= Harmonics; k++)
        {
            (first[k], second[k]) = (Phasor(_volt, 2 * device, k), Phasor(_volt, (2 * device) + 1, k));
        }

        for (int m = 0; m < FinePoints; m++)
        {
            (double v1, double v2) = (_restVolt[2 * device], _restVolt[(2 * device) + 1]);
            for (int k = 0; k <= Harmonics; k++)
            {
                Complex turn = _turns[k * m % FinePoints];
                v1 += (first[k].Real * turn.Real) - (first[k].Imaginary * turn.Imaginary);
                v2 += (second[k].Real * turn.Real) - (second[k].Imaginary * turn.Imaginary);
            }

            least = Math.Min(least, value(v1, v2));
        }

        return least;
    }

    /// <summary>The harmonic of a waveform at a port: amplitude and phase, for 0 the mean.</summary>
    private static Complex Phasor(double[] wave, int port, int harmonic)
    {
        Complex sum = Complex.Zero;
        for (int m = 0; m < Points; m++)
        {
            sum += wave[(port * Points) + m] * Complex.Conjugate(_turns[harmonic * m * (FinePoints / Points) % FinePoints]);
        }

        return sum * ((harmonic == 0 ? 1.0 : 2.0) / Points);
    }

    private double Linear(int unknown, double antennaVolt) =>
        antennaVolt * (_network.FromAntenna[unknown / Points] * _turns[unknown % Points * (FinePoints / Points)]).Real;

    /// <summary>What currents and charges of the past, n points ago, do to a port now: the impedances in time.</summary>
    private void FillKernels()
    {
        for (int pair = 0; pair < _ports * _ports; pair++)
        {
            for (int n = 0; n < Points; n++)
            {
                (double current, double charge) = (_network.Impedance[0][pair].Real, 0);
                for (int k = 1; k <= Harmonics; k++)
                {
                    Complex turned = 2 * _network.Impedance[k][pair] * _turns[k * n * (FinePoints / Points) % FinePoints];
                    current += turned.Real;
                    charge -= k * _omega * turned.Imaginary;
                }

                _byCurrent[(pair * Points) + n] = current / Points;
                _byCharge[(pair * Points) + n] = charge / Points;
            }
        }
    }

    /// <summary>What the devices draw beyond their linearisation.</summary>
    private void Evaluate(double[] volt)
    {
        for (int d = 0; d < _laws.Length; d++)
        {
            TwoPortPoint rest = _rest[d];
            (int first, int second) = (2 * d * Points, ((2 * d) + 1) * Points);
            for (int m = 0; m < Points; m++)
            {
                (double u1, double u2) = (volt[first + m], volt[second + m]);
                TwoPortPoint p = _laws[d].Evaluate(_restVolt[2 * d] + u1, _restVolt[(2 * d) + 1] + u2);
                _points[(d * Points) + m] = p;
                _current[first + m] = p.I1 - rest.I1 - (rest.G11 * u1) - (rest.G12 * u2);
                _current[second + m] = p.I2 - rest.I2 - (rest.G21 * u1) - (rest.G22 * u2);
                _charge[first + m] = p.Q1 - rest.Q1 - (rest.C11 * u1) - (rest.C12 * u2);
                _charge[second + m] = p.Q2 - rest.Q2 - (rest.C21 * u1) - (rest.C22 * u2);
            }
        }
    }

    private bool TryStep(double antennaVolt, out double largest)
    {
        int unknowns = _volt.Length;
        for (int i = 0; i < unknowns; i++)
        {
            (int p, int m) = (i / Points, i % Points);
            double sum = Linear(i, antennaVolt) - _tried[i];
            Span<double> row = _matrix.AsSpan(i * unknowns, unknowns);
            for (int q = 0; q < _ports; q += 2)
            {
                int kernel = ((p * _ports) + q) * Points;
                for (int n = 0; n < Points; n++)
                {
                    int ago = (m - n) & (Points - 1);
                    (double z1, double z2) = (_byCurrent[kernel + ago], _byCurrent[kernel + Points + ago]);
                    (double c1, double c2) = (_byCharge[kernel + ago], _byCharge[kernel + Points + ago]);
                    (int first, int second) = ((q * Points) + n, ((q + 1) * Points) + n);
                    TwoPortPoint now = _points[(q / 2 * Points) + n], rest = _rest[q / 2];
                    sum -= (z1 * _current[first]) + (z2 * _current[second]) + (c1 * _charge[first]) + (c2 * _charge[second]);
                    row[first] = (z1 * (now.G11 - rest.G11)) + (z2 * (now.G21 - rest.G21))
                        + (c1 * (now.C11 - rest.C11)) + (c2 * (now.C21 - rest.C21));
                    row[second] = (z1 * (now.G12 - rest.G12)) + (z2 * (now.G22 - rest.G22))
                        + (c1 * (now.C12 - rest.C12)) + (c2 * (now.C22 - rest.C22));
                }
            }

            row[i] += 1;
            _step[i] = sum;
        }

        largest = double.NaN;
        return DenseLu.TrySolve(_matrix, _step) && TryMove(out largest);
    }

    /// <summary>Takes the step, shortened where it would throw a junction far up its exponential.</summary>
    private bool TryMove(out double largest)
    {
        largest = 0;
        for (int d = 0; d < _laws.Length; d++)
        {
            for (int m = 0; m < Points; m++)
            {
                (int first, int second) = ((2 * d * Points) + m, (((2 * d) + 1) * Points) + m);
                (double rest1, double rest2) = (_restVolt[2 * d], _restVolt[(2 * d) + 1]);
                (double v1, double v2) = (rest1 + _tried[first] + _step[first], rest2 + _tried[second] + _step[second]);
                _laws[d].LimitStep(rest1 + _tried[first], rest2 + _tried[second], ref v1, ref v2);
                largest = Math.Max(largest, Math.Max(Math.Abs(v1 - rest1 - _tried[first]), Math.Abs(v2 - rest2 - _tried[second])));
                (_tried[first], _tried[second]) = (v1 - rest1, v2 - rest2);
            }
        }

        return double.IsFinite(largest);
    }
}
