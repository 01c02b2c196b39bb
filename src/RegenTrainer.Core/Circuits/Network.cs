using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// The topology of a circuit, compiled once: unknowns, entries of the matrices G and C of the pencil (G + sC) x = b, and where
/// each part stamps [Ho, Ruehli and Brennan 1975, modified nodal equations].
/// </summary>
/// <remarks>
/// Unknowns are the node voltages, an inner node behind the base or anode lead of every device, and a scaled current for every winding
/// section, inductor and ideal source (ampere times <see cref="CurrentScaleOhm"/>, so that all unknowns are of one size).
/// </remarks>
public sealed class Network
{
    /// <summary>Scale of the branch currents and of their equations, in ohm.</summary>
    public const double CurrentScaleOhm = 1000;

    private readonly Dictionary<string, int> _nodes;
    private readonly bool[] _isBranch;

    private Network(NetworkBuilder builder)
    {
        Parts = builder.Parts;
        _nodes = builder.Nodes;
        UnknownNames = [.. builder.UnknownNames];
        NodeNames = [.. builder.NodeNames];
        Size = builder.UnknownNames.Count;
        Rows = [.. builder.Rows];
        Columns = [.. builder.Columns];
        Resistors = [.. builder.Resistors];
        Capacitors = [.. builder.Capacitors];
        Branches = [.. builder.Branches];
        WindingGroups = [.. builder.WindingGroups];
        Feedbacks = [.. builder.Feedbacks];
        Devices = [.. builder.Devices];
        Tuning = builder.Tuning;
        Control = builder.Control;
        _isBranch = new bool[Size];
        foreach (BranchStamp branch in Branches)
        {
            _isBranch[branch.Unknown] = true;
        }

        CapacitiveEntries = builder.CapacitiveEntries();
        LateUnknowns = [.. Devices.SelectMany(d => new[] { d.Control, d.Output, d.Common }).Where(u => u >= 0).Distinct().Order()];
        (PinnedAlways, PinnedDirect, PinnedDirectRemoved, PinnedRemoved) = builder.FindPins();
    }

    /// <summary>The parts this network was compiled from.</summary>
    public IReadOnlyList<Part> Parts { get; }

    /// <summary>Number of unknowns.</summary>
    public int Size { get; }

    /// <summary>What each unknown is, in words.</summary>
    public IReadOnlyList<string> UnknownNames { get; }

    /// <summary>The names of the circuit's own nodes, in order of their unknowns.</summary>
    public IReadOnlyList<string> NodeNames { get; }

    /// <summary>The devices, in the order of the parts.</summary>
    public IReadOnlyList<DeviceStamp> Devices { get; }

    /// <summary>Where the tuning capacitor stands; null where there is none.</summary>
    public CapacitorStamp? Tuning { get; }

    /// <summary>Where the controlled element stands; null where there is none.</summary>
    public ControlStamp? Control { get; }

    internal int[] Rows { get; }

    internal int[] Columns { get; }

    internal ResistorStamp[] Resistors { get; }

    internal CapacitorStamp[] Capacitors { get; }

    internal BranchStamp[] Branches { get; }

    internal WindingStamp[] WindingGroups { get; }

    internal FeedbackStamp[] Feedbacks { get; }

    /// <summary>Entries that can hold a capacitance or inductance.</summary>
    internal int[] CapacitiveEntries { get; }

    /// <summary>The unknowns devices are connected to: all others see only linear parts.</summary>
    internal int[] LateUnknowns { get; }

    /// <summary>Diagonal entries of nodes that nothing joins to earth even at alternating current: a fault.</summary>
    internal int[] PinnedAlways { get; }

    /// <summary>Diagonal entries that fix islands which carry no direct current at zero volt.</summary>
    internal int[] PinnedDirect { get; }

    /// <summary>The same with the regenerating device out of its socket.</summary>
    internal int[] PinnedDirectRemoved { get; }

    /// <summary>Diagonal entries of nodes that float at alternating current with the regenerating device out.</summary>
    internal int[] PinnedRemoved { get; }

    /// <summary>The unknown of a node; -1 for earth.</summary>
    /// <exception cref="KeyNotFoundException">There is no such node.</exception>
    public int NodeIndex(string name) => string.Equals(name, Part.Earth, StringComparison.Ordinal) ? -1 : _nodes[name];

    /// <summary>Whether an unknown is a current rather than a voltage.</summary>
    public bool IsBranch(int unknown) => _isBranch[unknown];

    /// <summary>Whether a node exists.</summary>
    public bool HasNode(string name) => string.Equals(name, Part.Earth, StringComparison.Ordinal) || _nodes.ContainsKey(name);

    /// <summary>Compiles a circuit.</summary>
    /// <param name="parts">Parts with unique names; every node is joined to earth through parts.</param>
    /// <exception cref="InvalidOperationException">Two roles clash, a windings part does not fit its model, or a node floats; the message names it.</exception>
    public static Network Compile(IReadOnlyList<Part> parts)
    {
        var network = new Network(new NetworkBuilder(parts));
        if (network.PinnedAlways.Length > 0)
        {
            throw new InvalidOperationException(
                $"the node {network.UnknownNames[network.Rows[network.PinnedAlways[0]]]} floats: nothing joins it to earth");
        }

        return network;
    }
}

/// <summary>The four entries of a two-terminal admittance; -1 where an end is earth.</summary>
/// <param name="From">Unknown of the first end, -1 for earth.</param>
/// <param name="To">Unknown of the second end, -1 for earth.</param>
/// <param name="FromFrom">Entry (From, From).</param>
/// <param name="ToTo">Entry (To, To).</param>
/// <param name="FromTo">Entry (From, To).</param>
/// <param name="ToFrom">Entry (To, From).</param>
public readonly record struct PairStamp(int From, int To, int FromFrom, int ToTo, int FromTo, int ToFrom)
{
    internal void Add(double[] values, double admittance)
    {
        if (FromFrom >= 0)
        {
            values[FromFrom] += admittance;
        }

        if (ToTo >= 0)
        {
            values[ToTo] += admittance;
        }

        if (FromTo >= 0)
        {
            values[FromTo] -= admittance;
            values[ToFrom] -= admittance;
        }
    }
}

/// <summary>A fixed resistor.</summary>
internal readonly record struct ResistorStamp(PairStamp Pair, double Ohm);

/// <summary>A capacitor.</summary>
/// <param name="Pair">Its entries.</param>
/// <param name="Farad">Its value; for the tuning capacitor the value given in the part.</param>
/// <param name="Q">One over its loss tangent; null for none.</param>
public readonly record struct CapacitorStamp(PairStamp Pair, double Farad, double? Q);

/// <summary>A current unknown: a winding section, an inductor or a source.</summary>
/// <param name="FromBranch">Entry (node From, branch).</param>
/// <param name="ToBranch">Entry (node To, branch).</param>
/// <param name="BranchFrom">Entry (branch, node From).</param>
/// <param name="BranchTo">Entry (branch, node To).</param>
/// <param name="Diagonal">Entry (branch, branch).</param>
/// <param name="Unknown">Number of the unknown.</param>
/// <param name="Henry">Inductance; 0 for sources and winding sections.</param>
/// <param name="SeriesOhm">Resistance at direct and alternating current.</param>
/// <param name="Q">Constant Q adding series resistance at alternating current; null for none.</param>
/// <param name="Volt">Direct voltage of a supply.</param>
/// <param name="Kind">What the branch is.</param>
/// <param name="Emf">Share of the antenna's electromotive force in it, positive at its first end; 0 where it is no antenna.</param>
internal readonly record struct BranchStamp(
    int FromBranch, int ToBranch, int BranchFrom, int BranchTo, int Diagonal, int Unknown,
    double Henry, double SeriesOhm, double? Q, double Volt, BranchKind Kind, double Emf);

/// <summary>What a current unknown belongs to.</summary>
internal enum BranchKind
{
    Inductor,
    Supply,
    Antenna,
    Section,
}

/// <summary>The section matrix of coupled windings: entry numbers row by row, and the index of the first branch.</summary>
internal readonly record struct WindingStamp(IWindingModel Model, int[] Entries, int[] BranchDiagonals);

/// <summary>An ideal feedback element.</summary>
/// <param name="Entries">Entries (out, sense) with signs: OutFrom/SenseFrom, OutFrom/SenseTo, OutTo/SenseFrom, OutTo/SenseTo.</param>
/// <param name="Terminals">Unknowns SenseFrom, SenseTo, OutFrom, OutTo; -1 for earth.</param>
/// <param name="Siemens">Transconductance at factor 1.</param>
/// <param name="Factor">Fixed factor; ignored where the control gives it.</param>
/// <param name="Controlled">Whether the control gives the factor.</param>
/// <param name="Regenerating">Whether it is taken out for "regeneration off".</param>
internal readonly record struct FeedbackStamp(int[] Entries, int[] Terminals, double Siemens, double Factor, bool Controlled, bool Regenerating);

/// <summary>
/// A device as a two-port of control, output and common. A diode has no output terminal: its output stands at earth, where its
/// law neither takes nor gives anything.
/// </summary>
/// <param name="Part">The part.</param>
/// <param name="Model">The type in the part's socket.</param>
/// <param name="Control">Unknown of the inner control terminal.</param>
/// <param name="Output">Unknown of the output terminal, -1 for earth and for none.</param>
/// <param name="Common">Unknown of the common terminal, -1 for earth.</param>
/// <param name="LeadResistance">Entries of the resistance between control lead and inner control terminal.</param>
/// <param name="Entries">The nine entries, rows and columns in the order control, output, common; -1 where earth or none.</param>
/// <param name="Regenerating">Whether it is taken out for "regeneration off".</param>
public sealed record DeviceStamp(
    Part Part, DeviceModel Model, int Control, int Output, int Common, PairStamp LeadResistance, int[] Entries, bool Regenerating);

/// <summary>The element the regeneration control turns.</summary>
/// <param name="Pair">Entries of a controlled resistor; null for a feedback factor.</param>
/// <param name="FeedbackIndex">Index of a controlled feedback element; -1 for a resistor.</param>
public sealed record ControlStamp(PairStamp? Pair, int FeedbackIndex);
