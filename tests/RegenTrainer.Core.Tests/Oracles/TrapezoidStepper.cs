using MathNet.Numerics.LinearAlgebra;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// The trapezoidal rule on charges and fluxes, for the departure y from the operating point:
/// (2/h)(Q(y1) - Q(y0)) + F(y1) + F(y0) = b1 + b0. The linear part, devices' slopes at the operating point included, is
/// factored once; what a device's law adds to that is solved at its ports in every step by Newton's method.
/// </summary>
/// <remarks>
/// The state carried is s = (2/h) Q - F + b, so that (2/h) Q1 + F1 - b1 = s0. Rows without storage are met at the new instant
/// alone, which keeps the rule from ringing on them.
/// </remarks>
internal sealed class TrapezoidStepper
{
    private readonly OracleCircuit _circuit;
    private readonly int _n;
    private readonly int _ports;
    private readonly bool _linear;
    private readonly double _twoOverH;
    private readonly double[] _inverse;
    private readonly double[] _storage;
    private readonly (int Row, int Column, double Value)[] _stored;
    private readonly bool[] _algebraic;
    private readonly double[] _portResponse;
    private readonly double[][] _portColumns;
    private readonly PortExcess[] _excess;
    private readonly double[] _state;
    private readonly double[] _right;
    private readonly double[] _portDrive;
    private readonly double[] _portVolt;
    private readonly double[] _portBefore;

    internal TrapezoidStepper(OracleCircuit circuit, OracleBias bias, double stepSeconds, bool linear)
    {
        (_circuit, _linear) = (circuit, linear);
        _n = circuit.Size;
        _ports = 2 * circuit.Devices.Count;
        _twoOverH = 2 / stepSeconds;
        double[,] conductance = circuit.ConductanceMatrix();
        double[,] storage = circuit.StorageMatrix();
        _excess = new PortExcess[circuit.Devices.Count];
        for (int d = 0; d < _excess.Length; d++)
        {
            OracleDevicePlace place = circuit.Devices[d];
            (double[,] siemens, double[,] farad) = bias.Slopes(place);
            AddTwoPort(conductance, place, siemens);
            AddTwoPort(storage, place, farad);
            _excess[d] = new PortExcess(place.Device.Law, bias.Ports(place), siemens, farad, _twoOverH);
        }

        _algebraic = new bool[_n];
        for (int i = 0; i < _n; i++)
        {
            _algebraic[i] = true;
            for (int j = 0; j < _n; j++)
            {
                _algebraic[i] &= storage[i, j] == 0;
            }
        }

        Matrix<double> left = (_twoOverH * Matrix<double>.Build.DenseOfArray(storage)) + Matrix<double>.Build.DenseOfArray(conductance);
        _inverse = Inverse(left).ToRowMajorArray();
        _storage = Matrix<double>.Build.DenseOfArray(storage).ToRowMajorArray();
        _stored =
        [
            .. Enumerable.Range(0, _n * _n).Where(k => _storage[k] != 0).Select(k => (k / _n, k % _n, _storage[k])),
        ];
        _portColumns = [.. Enumerable.Range(0, _ports).Select(PortColumn)];
        _portResponse = PortResponse();
        (_state, _right) = (new double[_n], new double[_n]);
        (Unknowns, _portDrive, _portVolt) = (new double[_n], new double[_ports], new double[_ports]);
        _portBefore = new double[_ports];
        Sources = new double[_n];
    }

    /// <summary>Sources at the new instant, to be set before each step: volt on branch rows, ampere into nodes.</summary>
    internal double[] Sources { get; }

    /// <summary>Departure of the unknowns from the operating point.</summary>
    internal double[] Unknowns { get; }

    /// <summary>Number of unknowns.</summary>
    internal int Size => _n;

    /// <summary>Moves on by one step.</summary>
    internal void Step()
    {
        for (int i = 0; i < _n; i++)
        {
            _right[i] = Sources[i] + _state[i];
        }

        Multiply(_inverse, _right, Unknowns);
        if (!_linear && _ports > 0)
        {
            SolvePorts();
        }

        for (int i = 0; i < _n; i++)
        {
            _state[i] = _algebraic[i] ? 0 : -_state[i];
        }

        foreach ((int row, int column, double value) in _stored)
        {
            _state[row] += 2 * _twoOverH * value * Unknowns[column];
        }

        if (!_linear)
        {
            for (int p = 0; p < _ports; p++)
            {
                AddToState(p, 2 * _twoOverH * _excess[p / 2].Charge(p % 2));
            }
        }
    }

    /// <summary>The matrix that moves the state s on by one step where no source acts.</summary>
    internal Matrix<double> FreeStep()
    {
        Matrix<double> step = (2 * _twoOverH * Square(_storage) * Square(_inverse)) - Matrix<double>.Build.DenseIdentity(_n);
        for (int i = 0; i < _n; i++)
        {
            if (_algebraic[i])
            {
                step.ClearRow(i);
            }
        }

        return step;
    }

    /// <summary>The row that reads an unknown, after the next free step, out of the state s.</summary>
    internal Vector<double> ReadingOf(int unknown) => Square(_inverse).Row(unknown);

    /// <summary>A copy of the state s.</summary>
    internal Vector<double> State() => Vector<double>.Build.Dense([.. _state]);

    /// <summary>Inverse with rows and columns brought to one size first, since ohms and siemens stand side by side.</summary>
    private static Matrix<double> Inverse(Matrix<double> matrix)
    {
        int n = matrix.RowCount;
        double[] row = [.. matrix.EnumerateRows().Select(r => 1 / r.AbsoluteMaximum())];
        Matrix<double> scaled = matrix.MapIndexed((i, _, v) => v * row[i]);
        double[] column = [.. scaled.EnumerateColumns().Select(c => 1 / c.AbsoluteMaximum())];
        scaled = scaled.MapIndexed((_, j, v) => v * column[j]);
        Matrix<double> identity = Matrix<double>.Build.DenseIdentity(n);
        Matrix<double> inverse = scaled.LU().Solve(identity);
        double error = ((scaled * inverse) - identity).InfinityNorm();
        if (!(error < 1e-8))
        {
            throw new InvalidOperationException("the stage's equations are singular: a node floats");
        }

        return inverse.MapIndexed((i, j, v) => v * column[i] * row[j]);
    }

    private static void AddTwoPort(double[,] matrix, OracleDevicePlace place, double[,] port)
    {
        int[] terminals = [place.Control, place.Output, place.Common];
        double[,] incidence = { { 1, 0 }, { 0, 1 }, { -1, -1 } };
        for (int i = 0; i < 3; i++)
        {
            for (int j = 0; j < 3; j++)
            {
                if (terminals[i] >= 0 && terminals[j] >= 0)
                {
                    for (int p = 0; p < 4; p++)
                    {
                        matrix[terminals[i], terminals[j]] += incidence[i, p / 2] * port[p / 2, p % 2] * incidence[j, p % 2];
                    }
                }
            }
        }
    }

    private Matrix<double> Square(double[] rowMajor) => Matrix<double>.Build.DenseOfRowMajor(_n, _n, rowMajor);

    private void Multiply(double[] matrix, double[] x, double[] result)
    {
        for (int i = 0; i < _n; i++)
        {
            double sum = 0;
            for (int j = 0; j < _n; j++)
            {
                sum += matrix[(i * _n) + j] * x[j];
            }

            result[i] = sum;
        }
    }

    private (int Plus, int Minus) Port(int port)
    {
        OracleDevicePlace place = _circuit.Devices[port / 2];
        return (port % 2 == 0 ? place.Control : place.Output, place.Common);
    }

    /// <summary>What one ampere through a port from outside does to every unknown.</summary>
    private double[] PortColumn(int port)
    {
        (int plus, int minus) = Port(port);
        double Entry(int row, int column) => column < 0 ? 0 : _inverse[(row * _n) + column];
        return [.. Enumerable.Range(0, _n).Select(i => Entry(i, plus) - Entry(i, minus))];
    }

    private double[] PortResponse()
    {
        double[] response = new double[_ports * _ports];
        for (int p = 0; p < _ports; p++)
        {
            for (int q = 0; q < _ports; q++)
            {
                response[(p * _ports) + q] = AcrossPort(p, _portColumns[q]);
            }
        }

        return response;
    }

    private double AcrossPort(int port, double[] unknowns)
    {
        (int plus, int minus) = Port(port);
        return (plus < 0 ? 0 : unknowns[plus]) - (minus < 0 ? 0 : unknowns[minus]);
    }

    private void AddToState(int port, double value)
    {
        (int plus, int minus) = Port(port);
        if (plus >= 0 && !_algebraic[plus])
        {
            _state[plus] += value;
        }

        if (minus >= 0 && !_algebraic[minus])
        {
            _state[minus] -= value;
        }
    }

    /// <summary>Solves u + Z d(u) = u_linear for the port voltages u, then corrects all unknowns.</summary>
    private void SolvePorts()
    {
        for (int p = 0; p < _ports; p++)
        {
            _portDrive[p] = AcrossPort(p, Unknowns);
            double now = _portVolt[p];
            _portVolt[p] += Math.Clamp(now - _portBefore[p], -0.01, 0.01);
            _portBefore[p] = now;
        }

        PortNewton.Solve(_excess, _portResponse, _portDrive, _portVolt);
        for (int p = 0; p < _ports; p++)
        {
            double[] column = _portColumns[p];
            double current = _excess[p / 2].Flow(p % 2);
            for (int i = 0; i < _n; i++)
            {
                Unknowns[i] -= column[i] * current;
            }
        }
    }
}
