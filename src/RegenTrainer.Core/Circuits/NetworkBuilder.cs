using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Circuits;

/// <summary>Numbers the unknowns of a circuit and gives every part its entries.</summary>
internal sealed class NetworkBuilder
{
    private readonly Dictionary<(int Row, int Column), int> _entries = [];
    private readonly HashSet<int> _capacitive = [];
    private readonly Joins _joins = new();

    public NetworkBuilder(IReadOnlyList<Part> parts)
    {
        Parts = parts;
        foreach (Part part in parts)
        {
            foreach (string node in part.Nodes)
            {
                if (!string.Equals(node, Part.Earth, StringComparison.Ordinal) && !Nodes.ContainsKey(node))
                {
                    Nodes.Add(node, UnknownNames.Count);
                    NodeNames.Add(node);
                    UnknownNames.Add(node);
                }
            }
        }

        foreach (Part part in parts)
        {
            Add(part);
        }

        for (int i = 0; i < UnknownNames.Count; i++)
        {
            Entry(i, i);   // every diagonal can be pinned
        }
    }

    public IReadOnlyList<Part> Parts { get; }

    public Dictionary<string, int> Nodes { get; } = new(StringComparer.Ordinal);

    public List<string> NodeNames { get; } = [];

    public List<string> UnknownNames { get; } = [];

    public List<int> Rows { get; } = [];

    public List<int> Columns { get; } = [];

    public List<ResistorStamp> Resistors { get; } = [];

    public List<CapacitorStamp> Capacitors { get; } = [];

    public List<BranchStamp> Branches { get; } = [];

    public List<WindingStamp> WindingGroups { get; } = [];

    public List<FeedbackStamp> Feedbacks { get; } = [];

    public List<DeviceStamp> Devices { get; } = [];

    public CapacitorStamp? Tuning { get; private set; }

    public ControlStamp? Control { get; private set; }

    public int[] CapacitiveEntries() => [.. _capacitive.Order()];

    /// <summary>The diagonal entries of one node in each island without a path to earth, for four ways of looking at the joins.</summary>
    public (int[] Always, int[] Direct, int[] DirectRemoved, int[] Removed) FindPins()
    {
        HashSet<int> branches = [.. Branches.Select(b => b.Unknown)];
        int[] Pins(Func<JoinKind, bool> counts) =>
            [.. _joins.Islands(UnknownNames.Count, branches, counts).Select(node => _entries[(node, node)])];
        return (
            Pins(_ => true), Pins(kind => kind != JoinKind.Alternating), Pins(kind => kind == JoinKind.Direct),
            Pins(kind => kind != JoinKind.RegeneratingDirect));
    }

    private int Index(string node) => string.Equals(node, Part.Earth, StringComparison.Ordinal) ? -1 : Nodes[node];

    private int Entry(int row, int column)
    {
        if (row < 0 || column < 0)
        {
            return -1;
        }

        if (!_entries.TryGetValue((row, column), out int entry))
        {
            entry = Rows.Count;
            _entries.Add((row, column), entry);
            Rows.Add(row);
            Columns.Add(column);
        }

        return entry;
    }

    private PairStamp Pair(int from, int to, bool capacitive)
    {
        bool self = from == to;
        var pair = self
            ? new PairStamp(-1, -1, -1, -1, -1, -1)   // both ends on one node: no effect
            : new PairStamp(from, to, Entry(from, from), Entry(to, to), Entry(from, to), Entry(to, from));
        if (capacitive)
        {
            Capacitive(pair.FromFrom, pair.ToTo, pair.FromTo, pair.ToFrom);
        }

        return pair;
    }

    private void Capacitive(params ReadOnlySpan<int> entries)
    {
        foreach (int entry in entries)
        {
            if (entry >= 0)
            {
                _capacitive.Add(entry);
            }
        }
    }

    private void Add(Part part)
    {
        switch (part)
        {
            case Resistor r:
                PairStamp pair = Pair(Index(r.From), Index(r.To), capacitive: false);
                _joins.Add(Index(r.From), Index(r.To), JoinKind.Direct);
                if (r.Role == PartRole.Regeneration)
                {
                    SetControl(new ControlStamp(pair, -1));
                }
                else
                {
                    Resistors.Add(new ResistorStamp(pair, r.Ohm));
                }

                break;
            case Capacitor c:
                AddCapacitor(Index(c.From), Index(c.To), c.Farad, c.Q, c.Role == PartRole.Tuning);
                break;
            case Inductor l:
                AddBranch(l.Name, l.From, l.To, l.Henry, l.SeriesOhm, l.Q, 0, BranchKind.Inductor);
                break;
            case Bead b:
                Resistors.Add(new ResistorStamp(Pair(Index(b.From), Index(b.To), capacitive: false), b.Ohm));
                AddBranch(b.Name, b.From, b.To, b.Henry, 0, null, 0, BranchKind.Inductor);
                if (b.Farad > 0)
                {
                    AddCapacitor(Index(b.From), Index(b.To), b.Farad, null, tuning: false);
                }

                break;
            case Supply s:
                AddBranch(s.Name, s.From, s.To, 0, s.SeriesOhm, null, s.Volt, BranchKind.Supply);
                break;
            case Antenna a:
                AddBranch(a.Name, a.From, a.To, 0, 0, null, 0, BranchKind.Antenna, emf: 1);
                break;
            case Windings w:
                AddWindings(w);
                break;
            case Feedback f:
                AddFeedback(f);
                break;
            case Bipolar q:
                AddDevice(q, q.Model, "base", q.Base, q.Collector, q.Emitter);
                break;
            case Diode d:
                AddDevice(d, d.Model, "anode", d.Anode, null, d.Cathode);
                break;
            default:
                throw new InvalidOperationException($"no stamp for a {part.GetType().Name}");
        }
    }

    private void SetControl(ControlStamp control)
    {
        if (Control is not null)
        {
            throw new InvalidOperationException("two parts have the role regeneration");
        }

        Control = control;
    }

    private void AddCapacitor(int from, int to, double farad, double? q, bool tuning)
    {
        var stamp = new CapacitorStamp(Pair(from, to, capacitive: true), farad, q);
        _joins.Add(from, to, JoinKind.Alternating);
        if (!tuning)
        {
            Capacitors.Add(stamp);
        }
        else if (Tuning is null)
        {
            Tuning = stamp;
        }
        else
        {
            throw new InvalidOperationException("two parts have the role tuning");
        }
    }

    private int AddBranch(string name, string from, string to, double henry, double ohm, double? q, double volt, BranchKind kind, double emf = 0)
    {
        int unknown = UnknownNames.Count;
        UnknownNames.Add("current of " + name);
        (int f, int t) = (Index(from), Index(to));
        var stamp = new BranchStamp(
            Entry(f, unknown), Entry(t, unknown), Entry(unknown, f), Entry(unknown, t), Entry(unknown, unknown), unknown, henry, ohm, q, volt, kind, emf);
        if (f == t)
        {
            stamp = stamp with { FromBranch = -1, ToBranch = -1, BranchFrom = -1, BranchTo = -1 };   // a short-circuited branch
        }

        Capacitive(stamp.Diagonal);
        _joins.Add(f, t, JoinKind.Direct);
        Branches.Add(stamp);
        return unknown;
    }

    private void AddWindings(Windings part)
    {
        int sections = part.Model.SectionCount;
        if (part.SectionNodes.Count != sections)
        {
            throw new InvalidOperationException($"{part.Name} has {sections} sections but nodes for {part.SectionNodes.Count}");
        }

        if (part.PickUp is { } pickUp && pickUp.Shares.Count != sections)
        {
            throw new InvalidOperationException($"{part.Name} has {sections} sections but {pickUp.Shares.Count} shares of the antenna");
        }

        int[] unknowns = new int[sections];
        for (int i = 0; i < sections; i++)
        {
            (string from, string to) = part.SectionNodes[i];
            unknowns[i] = AddBranch($"{part.Name}, section {i + 1}", from, to, 0, 0, null, 0, BranchKind.Section, -(part.PickUp?.Shares[i] ?? 0));
        }

        int[] entries = new int[sections * sections];
        for (int i = 0; i < sections; i++)
        {
            for (int j = 0; j < sections; j++)
            {
                entries[(i * sections) + j] = Entry(unknowns[i], unknowns[j]);
                Capacitive(entries[(i * sections) + j]);
            }
        }

        WindingGroups.Add(new WindingStamp(part.Model, entries, [.. unknowns.Select(u => Entry(u, u))]));
        foreach (Coils.WindingSpan span in part.Model.Windings)
        {
            if (span.SelfCapacitanceFarad > 0)
            {
                string start = part.SectionNodes[span.FirstSection].From;
                string end = part.SectionNodes[span.FirstSection + span.SectionCount - 1].To;
                AddCapacitor(Index(start), Index(end), span.SelfCapacitanceFarad, null, tuning: false);
            }
        }
    }

    private void AddFeedback(Feedback part)
    {
        int[] terminals = [Index(part.SenseFrom), Index(part.SenseTo), Index(part.OutFrom), Index(part.OutTo)];
        int[] entries =
        [
            Entry(terminals[2], terminals[0]), Entry(terminals[2], terminals[1]),
            Entry(terminals[3], terminals[0]), Entry(terminals[3], terminals[1]),
        ];
        bool controlled = part.Role == PartRole.Regeneration;
        if (controlled)
        {
            SetControl(new ControlStamp(null, Feedbacks.Count));
        }

        Feedbacks.Add(new FeedbackStamp(
            entries, terminals, part.Siemens, part.Factor, controlled, controlled || part.Role == PartRole.Regenerating));
    }

    private void AddDevice(Part part, DeviceModel model, string lead, string control, string? output, string common)
    {
        int inner = UnknownNames.Count;
        UnknownNames.Add($"inner {lead} of {part.Name}");
        int[] terminals = [inner, output is null ? -1 : Index(output), Index(common)];
        int[] entries = new int[9];
        for (int i = 0; i < 3; i++)
        {
            for (int j = 0; j < 3; j++)
            {
                entries[(i * 3) + j] = Entry(terminals[i], terminals[j]);
                Capacitive(entries[(i * 3) + j]);
            }
        }

        bool regenerating = part.Role == PartRole.Regenerating;
        JoinKind kind = regenerating ? JoinKind.RegeneratingDirect : JoinKind.Direct;
        _joins.Add(Index(control), inner, JoinKind.Direct);
        _joins.Add(inner, terminals[2], kind);
        if (output is not null)
        {
            _joins.Add(inner, terminals[1], kind);
        }

        Devices.Add(new DeviceStamp(
            part, model, inner, terminals[1], terminals[2], Pair(Index(control), inner, capacitive: false), entries, regenerating));
    }
}
