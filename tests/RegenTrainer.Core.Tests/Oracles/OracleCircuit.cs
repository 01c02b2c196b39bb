using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// The equations <c>C x' + G x + device currents = sources</c> of a list of parts, stamped independently of the program: node
/// voltages, then the currents of inductors, winding sections and sources. Currents run from <c>From</c> through the part.
/// </summary>
internal sealed class OracleCircuit
{
    private readonly Dictionary<string, int> _nodes = new(StringComparer.Ordinal);
    private readonly Dictionary<string, int> _branches = new(StringComparer.Ordinal);
    private readonly List<(int Row, int Column, double Value)> _conductance = [];
    private readonly List<(int Row, int Column, double Value)> _storage = [];
    private readonly List<(int Row, int Column, double Value)> _direct = [];
    private readonly List<(int Row, double Volt)> _directSources = [];
    private readonly List<int> _antennas = [];
    private readonly List<OracleDevicePlace> _devices = [];
    private readonly List<bool> _isBranch = [];
    private readonly double _omega;
    private readonly double _temperatureCelsius;
    private readonly OracleLossForm _lossForm;

    internal OracleCircuit(
        IReadOnlyList<Part> parts, IReadOnlyList<OracleDevice> devices, Grade grade, double temperatureCelsius, double lossHz, OracleLossForm lossForm)
    {
        _omega = 2 * Math.PI * lossHz;
        _temperatureCelsius = temperatureCelsius;
        _lossForm = lossForm;
        foreach (Part part in parts)
        {
            Stamp(part, grade);
        }

        foreach (OracleDevice device in devices)
        {
            AddDevice(device);
        }
    }

    internal int Size => _isBranch.Count;

    internal IReadOnlyList<int> Antennas => _antennas;

    internal IReadOnlyList<OracleDevicePlace> Devices => _devices;

    internal bool IsBranch(int unknown) => _isBranch[unknown];

    internal int NodeOf(string name) =>
        name == Part.Earth ? -1 : _nodes.TryGetValue(name, out int node) ? node : throw new ArgumentException($"no node {name}", nameof(name));

    internal int BranchOf(string name) =>
        _branches.TryGetValue(name, out int branch) ? branch : throw new ArgumentException($"no branch current {name}", nameof(name));

    internal double[,] ConductanceMatrix() => Dense(_conductance);

    internal double[,] StorageMatrix() => Dense(_storage);

    internal double[,] DirectMatrix() => Dense(_direct);

    internal double[] DirectSources()
    {
        double[] sources = new double[Size];
        foreach ((int row, double volt) in _directSources)
        {
            sources[row] += volt;
        }

        return sources;
    }

    private void Stamp(Part part, Grade grade)
    {
        switch (part)
        {
            case Resistor r:
                AddResistor(Node(r.From), Node(r.To), r.Ohm);
                break;
            case Capacitor c:
                AddCapacitor(Node(c.From), Node(c.To), c.Farad, c.Q);
                break;
            case Inductor l:
                AddInductor(l);
                break;
            case Bead b:
                AddResistor(Node(b.From), Node(b.To), b.Ohm);
                AddCapacitor(Node(b.From), Node(b.To), b.Farad, null);
                AddBranch(b.Name, Node(b.From), Node(b.To), b.Henry, 0, 0);
                break;
            case Supply s:
                _directSources.Add((AddBranch(s.Name, Node(s.From), Node(s.To), 0, s.SeriesOhm, s.SeriesOhm), s.Volt));
                break;
            case Antenna a:
                _antennas.Add(AddBranch(a.Name, Node(a.From), Node(a.To), 0, 0, 0));
                break;
            case Feedback f:
                AddFeedback(f);
                break;
            case Windings w:
                AddWindings(w);
                break;
            case Bipolar q:
                // The grade says which device sits in the regenerating socket; all others are typical.
                Grade own = q.Role == PartRole.Regenerating ? grade : Grade.Typical;
                AddDevice(new OracleDevice(q.Name, q.Base, q.Collector, q.Emitter, q.Model.BaseOhm(own), q.Model.LawAt(own, _temperatureCelsius)));
                break;
            case Diode d:
                AddDevice(new OracleDevice(
                    d.Name, d.Anode, Part.Earth, d.Cathode, d.Model.LeadOhm(Grade.Typical), d.Model.LawAt(Grade.Typical, _temperatureCelsius)));
                break;
            default:
                throw new NotSupportedException($"the carrier-level truth has no stamp for {part.GetType().Name} {part.Name}");
        }
    }

    private void AddInductor(Inductor l)
    {
        (int from, int to) = (Node(l.From), Node(l.To));
        if (l.Q is not { } q)
        {
            AddBranch(l.Name, from, to, l.Henry, l.SeriesOhm, l.SeriesOhm);
        }
        else if (_lossForm == OracleLossForm.Plain)
        {
            AddBranch(l.Name, from, to, l.Henry, l.SeriesOhm + (_omega * l.Henry / q), l.SeriesOhm);
        }
        else
        {
            // Exact series-to-parallel conversion at the reference frequency.
            double growth = 1 + (1 / (q * q));
            int inner = from;
            if (l.SeriesOhm > 0)
            {
                inner = NewUnknown(isBranch: false);
                AddResistor(from, inner, l.SeriesOhm);
            }

            AddBranch(l.Name, inner, to, l.Henry * growth, 0, 0);
            AddPair(_conductance, inner, to, 1 / (_omega * l.Henry * q * growth));
            AddPair(_direct, inner, to, 1 / (_omega * l.Henry * q * growth));
        }
    }

    private void AddCapacitor(int from, int to, double farad, double? lossQ)
    {
        if (lossQ is not { } q)
        {
            AddPair(_storage, from, to, farad);
        }
        else if (_lossForm == OracleLossForm.Plain)
        {
            AddPair(_storage, from, to, farad);
            AddPair(_conductance, from, to, _omega * farad / q);
        }
        else
        {
            double growth = 1 + (1 / (q * q));
            int inner = NewUnknown(isBranch: false);
            AddPair(_storage, from, inner, farad * growth);
            AddResistor(inner, to, 1 / (_omega * farad * q * growth));
        }
    }

    private void AddWindings(Windings w)
    {
        IWindingModel model = w.Model;
        int n = model.SectionCount;
        if (w.SectionNodes.Count != n)
        {
            throw new ArgumentException($"{w.Name} has {w.SectionNodes.Count} pairs of nodes for {n} sections", nameof(w));
        }

        double[] ohm = new double[n * n];
        model.SeriesOhm(_omega / (2 * Math.PI), _temperatureCelsius, ohm);
        int[] branch = new int[n];
        for (int i = 0; i < n; i++)
        {
            (string from, string to) = w.SectionNodes[i];
            branch[i] = AddBranch($"{w.Name}:{i}", Node(from), Node(to), 0, 0, model.DcOhm(i, _temperatureCelsius));
        }

        for (int i = 0; i < n; i++)
        {
            for (int j = 0; j < n; j++)
            {
                _conductance.Add((branch[i], branch[j], -ohm[(i * n) + j]));
                _storage.Add((branch[i], branch[j], -model.Henry(i, j)));
            }
        }

        foreach (WindingSpan span in model.Windings)
        {
            int first = Node(w.SectionNodes[span.FirstSection].From);
            int last = Node(w.SectionNodes[span.FirstSection + span.SectionCount - 1].To);
            AddPair(_storage, first, last, span.SelfCapacitanceFarad);
        }
    }

    private void AddFeedback(Feedback f)
    {
        double siemens = f.Siemens * f.Factor;
        foreach ((string outNode, double outSign) in new[] { (f.OutFrom, 1.0), (f.OutTo, -1.0) })
        {
            foreach ((string senseNode, double senseSign) in new[] { (f.SenseFrom, 1.0), (f.SenseTo, -1.0) })
            {
                Add(_conductance, Node(outNode), Node(senseNode), outSign * senseSign * siemens);
                Add(_direct, Node(outNode), Node(senseNode), outSign * senseSign * siemens);
            }
        }
    }

    private void AddDevice(OracleDevice device)
    {
        int control = Node(device.Control);
        if (device.LeadOhm > 0)
        {
            int inner = NewUnknown(isBranch: false);
            AddResistor(control, inner, device.LeadOhm);
            control = inner;
        }

        _devices.Add(new OracleDevicePlace(device, control, Node(device.Output), Node(device.Common)));
    }

    private void AddResistor(int from, int to, double ohm)
    {
        AddPair(_conductance, from, to, 1 / ohm);
        AddPair(_direct, from, to, 1 / ohm);
    }

    /// <summary>Adds a branch: v(from) - v(to) - ohm x i - henry x di/dt = source.</summary>
    private int AddBranch(string name, int from, int to, double henry, double ohm, double directOhm)
    {
        int k = NewUnknown(isBranch: true);
        _branches.Add(name, k);
        foreach (List<(int, int, double)> matrix in new[] { _conductance, _direct })
        {
            Add(matrix, from, k, 1);
            Add(matrix, to, k, -1);
            Add(matrix, k, from, 1);
            Add(matrix, k, to, -1);
        }

        _conductance.Add((k, k, -ohm));
        _direct.Add((k, k, -directOhm));
        _storage.Add((k, k, -henry));
        return k;
    }

    private int Node(string name)
    {
        if (name == Part.Earth)
        {
            return -1;
        }

        if (!_nodes.TryGetValue(name, out int node))
        {
            node = NewUnknown(isBranch: false);
            _nodes.Add(name, node);
        }

        return node;
    }

    private int NewUnknown(bool isBranch)
    {
        _isBranch.Add(isBranch);
        return _isBranch.Count - 1;
    }

    private static void AddPair(List<(int Row, int Column, double Value)> matrix, int from, int to, double value)
    {
        Add(matrix, from, from, value);
        Add(matrix, to, to, value);
        Add(matrix, from, to, -value);
        Add(matrix, to, from, -value);
    }

    private static void Add(List<(int Row, int Column, double Value)> matrix, int row, int column, double value)
    {
        if (row >= 0 && column >= 0)
        {
            matrix.Add((row, column, value));
        }
    }

    private double[,] Dense(List<(int Row, int Column, double Value)> entries)
    {
        double[,] dense = new double[Size, Size];
        foreach ((int row, int column, double value) in entries)
        {
            dense[row, column] += value;
        }

        return dense;
    }
}
