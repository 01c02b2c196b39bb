using System.Numerics;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// The numbers of a network at one setting: the matrices G and C of the pencil, and the matrix and right side of the direct
/// currents. Changing the control, the dial or a device writes values only and allocates nothing.
/// </summary>
public sealed class NetworkValues
{
    private readonly Network _network;
    private readonly double[] _baseG;
    private readonly double[] _baseC;
    private readonly double[] _baseDirect;
    private readonly double[] _sectionOhm;
    private readonly IDeviceLaw[] _laws;
    private NetworkConditions? _conditions;

    /// <summary>Makes room for a network's values.</summary>
    public NetworkValues(Network network)
    {
        _network = network;
        int entries = network.Rows.Length;
        (_baseG, _baseC, _baseDirect) = (new double[entries], new double[entries], new double[entries]);
        (G, C, Direct, DirectRight) = (new double[entries], new double[entries], new double[entries], new double[network.Size]);
        int sections = network.WindingGroups.Length == 0 ? 0 : network.WindingGroups.Max(w => w.Model.SectionCount);
        _sectionOhm = new double[sections * sections];
        _laws = new IDeviceLaw[network.Devices.Count];
    }

    /// <summary>Conductances of the pencil, one per entry of the network.</summary>
    public double[] G { get; }

    /// <summary>Capacitances and inductances of the pencil, one per entry.</summary>
    public double[] C { get; }

    /// <summary>The linear direct-current matrix, one per entry.</summary>
    public double[] Direct { get; }

    /// <summary>The direct sources, one per unknown.</summary>
    public double[] DirectRight { get; }

    /// <summary>The conditions the fixed parts stand at.</summary>
    public NetworkConditions Conditions => _conditions ?? throw new InvalidOperationException("no conditions set yet");

    /// <summary>The law of a device under the present conditions.</summary>
    public IDeviceLaw Law(int device) => _laws[device];

    /// <summary>Sets what the fixed parts depend on; does nothing where it is so already.</summary>
    public void SetConditions(in NetworkConditions conditions)
    {
        if (_conditions == conditions)
        {
            return;
        }

        bool sameDevices = _conditions is { } old && old with { LossHz = conditions.LossHz, SupplyVolt = conditions.SupplyVolt } == conditions;
        _conditions = conditions;
        Array.Clear(_baseG);
        Array.Clear(_baseC);
        Array.Clear(_baseDirect);
        Array.Clear(DirectRight);
        double omega = 2 * Math.PI * conditions.LossHz;
        foreach (ResistorStamp r in _network.Resistors)
        {
            r.Pair.Add(_baseG, 1 / r.Ohm);
            r.Pair.Add(_baseDirect, 1 / r.Ohm);
        }

        foreach (CapacitorStamp c in _network.Capacitors)
        {
            c.Pair.Add(_baseC, c.Farad);
            c.Pair.Add(_baseG, c.Q is { } q ? omega * c.Farad / q : 0);
        }

        foreach (FeedbackStamp f in _network.Feedbacks)
        {
            if (!f.Controlled && !f.Regenerating)
            {
                AddFeedback(_baseG, f, f.Siemens * f.Factor);
                AddFeedback(_baseDirect, f, f.Siemens * f.Factor);
            }
        }

        SetBranches(conditions, omega);
        SetDevices(conditions, sameDevices);
    }

    /// <summary>Writes the linear direct-current matrix for a control value.</summary>
    /// <param name="controlValue">Value of the controlled element; ignored where there is none.</param>
    /// <param name="regeneratingRemoved">Whether the regenerating devices are out of their sockets.</param>
    public void SetDirect(double controlValue, bool regeneratingRemoved)
    {
        Array.Copy(_baseDirect, Direct, Direct.Length);
        AddControl(Direct, controlValue, regeneratingRemoved);
        foreach (int entry in regeneratingRemoved ? _network.PinnedDirectRemoved : _network.PinnedDirect)
        {
            Direct[entry] += 1;   // carries no current: nothing else joins the island to earth
        }
    }

    /// <summary>Writes G and C.</summary>
    /// <param name="tuningFarad">The tuning capacitor in farad.</param>
    /// <param name="controlValue">Value of the controlled element; ignored where there is none.</param>
    /// <param name="devices">A linearisation for each device.</param>
    /// <param name="regeneratingShare">1 with the regenerating devices in their sockets, 0 out of them; between only while following a mode.</param>
    /// <param name="feedbackStrength">Factor on the transconductance of regenerating feedback elements.</param>
    public void SetPencil(
        double tuningFarad, double controlValue, ReadOnlySpan<Linearisation> devices, double regeneratingShare, double feedbackStrength = 1)
    {
        Array.Copy(_baseG, G, G.Length);
        Array.Copy(_baseC, C, C.Length);
        SetTuning(tuningFarad);
        AddControl(G, controlValue, regeneratingShare * feedbackStrength);
        for (int d = 0; d < devices.Length; d++)
        {
            DeviceStamp stamp = _network.Devices[d];
            double share = stamp.Regenerating ? regeneratingShare : 1;
            if (share > 0)
            {
                AddTwoPort(stamp.Entries, devices[d], share);
            }
        }

        if (regeneratingShare <= 0)
        {
            foreach (int entry in _network.PinnedRemoved)
            {
                G[entry] += 1;
            }
        }
    }

    /// <summary>Adds a capacitance (negative to take away) to the tuning capacitor of the present pencil, with its loss.</summary>
    public void SetTuning(double farad)
    {
        if (_network.Tuning is { } tuning)
        {
            tuning.Pair.Add(C, farad);
            tuning.Pair.Add(G, TuningLossPerFarad * farad);
        }
    }

    /// <summary>Conductance per farad of the tuning capacitor's loss tangent, in siemens per farad.</summary>
    public double TuningLossPerFarad =>
        _network.Tuning?.Q is { } q ? 2 * Math.PI * Conditions.LossHz / q : 0;

    /// <summary>The change of the control's stamp in G per unit of its value: its coefficient for <see cref="ControlBilinear"/>.</summary>
    /// <param name="controlValue">Value of the controlled element.</param>
    public double ControlCoefficient(double controlValue) =>
        _network.Control is not { } control ? 0
        : control.Pair is not null ? -1 / (controlValue * controlValue)
        : _network.Feedbacks[control.FeedbackIndex].Siemens;

    /// <summary>w' E x for the pattern E of the controlled element.</summary>
    public Complex ControlBilinear(ReadOnlySpan<Complex> w, ReadOnlySpan<Complex> x)
    {
        if (_network.Control is not { } control)
        {
            return Complex.Zero;
        }

        if (control.Pair is { } pair)
        {
            return Across(w, pair.From, pair.To) * Across(x, pair.From, pair.To);
        }

        int[] t = _network.Feedbacks[control.FeedbackIndex].Terminals;
        return Across(w, t[2], t[3]) * Across(x, t[0], t[1]);
    }

    /// <summary>The difference of two unknowns, earth being zero.</summary>
    public static Complex Across(ReadOnlySpan<Complex> v, int from, int to) =>
        (from < 0 ? Complex.Zero : v[from]) - (to < 0 ? Complex.Zero : v[to]);

    private static void AddFeedback(double[] values, in FeedbackStamp f, double siemens)
    {
        for (int k = 0; k < 4; k++)
        {
            if (f.Entries[k] >= 0)
            {
                values[f.Entries[k]] += k is 0 or 3 ? siemens : -siemens;
            }
        }
    }

    private void AddControl(double[] values, double controlValue, bool removed) => AddControl(values, controlValue, removed ? 0.0 : 1.0);

    private void AddControl(double[] values, double controlValue, double share)
    {
        if (_network.Control is { Pair: { } pair })
        {
            pair.Add(values, 1 / controlValue);
        }

        foreach (FeedbackStamp f in _network.Feedbacks)
        {
            if (f.Controlled || f.Regenerating)
            {
                AddFeedback(values, f, share * f.Siemens * (f.Controlled ? controlValue : f.Factor));
            }
        }
    }

    private void SetBranches(in NetworkConditions conditions, double omega)
    {
        const double scale = Network.CurrentScaleOhm;
        foreach (BranchStamp b in _network.Branches)
        {
            AddBranch(_baseG, b, scale);
            AddBranch(_baseDirect, b, scale);
            double alternatingOhm = b.SeriesOhm + (b.Q is { } q ? omega * b.Henry / q : 0);
            _baseG[b.Diagonal] -= alternatingOhm / (scale * scale);
            _baseDirect[b.Diagonal] -= Math.Max(b.SeriesOhm, b.Kind == BranchKind.Inductor ? SmallestDirectOhm : 0) / (scale * scale);
            _baseC[b.Diagonal] -= b.Henry / (scale * scale);
            if (b.Kind == BranchKind.Supply)
            {
                double volt = conditions.SupplyVolt is { } magnitude ? Math.CopySign(magnitude, b.Volt) : b.Volt;
                DirectRight[b.Unknown] += volt / scale;
            }
        }

        foreach (WindingStamp winding in _network.WindingGroups)
        {
            IWindingModel model = winding.Model;
            int n = model.SectionCount;
            model.SeriesOhm(conditions.LossHz, conditions.TemperatureCelsius, _sectionOhm.AsSpan(0, n * n));
            for (int i = 0; i < n; i++)
            {
                _baseDirect[winding.BranchDiagonals[i]] -= model.DcOhm(i, conditions.TemperatureCelsius) / (scale * scale);
                for (int j = 0; j < n; j++)
                {
                    int entry = winding.Entries[(i * n) + j];
                    _baseG[entry] -= _sectionOhm[(i * n) + j] / (scale * scale);
                    _baseC[entry] -= model.Henry(i, j) / (scale * scale);
                }
            }
        }
    }

    private static void AddBranch(double[] values, in BranchStamp b, double scale)
    {
        if (b.FromBranch >= 0)
        {
            values[b.FromBranch] += 1 / scale;
            values[b.BranchFrom] += 1 / scale;
        }

        if (b.ToBranch >= 0)
        {
            values[b.ToBranch] -= 1 / scale;
            values[b.BranchTo] -= 1 / scale;
        }
    }

    private void SetDevices(in NetworkConditions conditions, bool sameLaws)
    {
        for (int d = 0; d < _laws.Length; d++)
        {
            DeviceStamp stamp = _network.Devices[d];
            DeviceModel model = stamp.Regenerating && conditions.ReplacementDevice is { } replacement ? replacement : stamp.Model;
            Grade grade = stamp.Regenerating ? conditions.Grade : Grade.Typical;
            if (!sameLaws || _laws[d] is null)
            {
                _laws[d] = model.LawAt(grade, conditions.TemperatureCelsius);
            }

            double leadSiemens = 1 / Math.Max(model.LeadOhm(grade), SmallestLeadOhm);
            stamp.LeadResistance.Add(_baseG, leadSiemens);
            stamp.LeadResistance.Add(_baseDirect, leadSiemens);
        }
    }

    /// <summary>A lead resistance of zero is taken as this many ohm, far below any that matters.</summary>
    private const double SmallestLeadOhm = 1e-3;

    /// <summary>Direct resistance in ohm of an inductor stated without any: it decides how parallel ones share a direct current.</summary>
    private const double SmallestDirectOhm = 1e-7;

    private void AddTwoPort(int[] entries, in Linearisation y, double share)
    {
        Add9(entries, G, share * y.G11, share * y.G12, share * y.G21, share * y.G22);
        Add9(entries, C, share * y.C11, share * y.C12, share * y.C21, share * y.C22);
    }

    /// <summary>Adds a two-port to the nine entries of its three terminals (its indefinite admittance matrix).</summary>
    internal static void Add9(int[] entries, Span<double> values, double y11, double y12, double y21, double y22)
    {
        Add(values, entries[0], y11);
        Add(values, entries[1], y12);
        Add(values, entries[2], -y11 - y12);
        Add(values, entries[3], y21);
        Add(values, entries[4], y22);
        Add(values, entries[5], -y21 - y22);
        Add(values, entries[6], -y11 - y21);
        Add(values, entries[7], -y12 - y22);
        Add(values, entries[8], y11 + y12 + y21 + y22);
    }

    private static void Add(Span<double> values, int entry, double value)
    {
        if (entry >= 0)
        {
            values[entry] += value;
        }
    }
}
