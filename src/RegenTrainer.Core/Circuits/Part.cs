using RegenTrainer.Core.Antennas;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Circuits;

/// <summary>One element of a stage at named nodes. The node <see cref="Earth"/> is the reference.</summary>
/// <param name="Name">The builder's name of the part, unique within a stage.</param>
public abstract record Part(string Name)
{
    /// <summary>The name of the reference node.</summary>
    public const string Earth = "earth";

    /// <summary>What the part does for the stage.</summary>
    public PartRole Role { get; init; }

    /// <summary>The names of all nodes the part is connected to, in the order of its terminals.</summary>
    public abstract IReadOnlyList<string> Nodes { get; }

    /// <summary>What lies outside the range the part's method was checked for, at a frequency.</summary>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    public virtual IReadOnlyList<Caution> CautionsAt(double hz) => [];

    /// <summary>Electromotive force over field in m, where the part is an antenna of known size; null elsewhere.</summary>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    public virtual double? EffectiveHeightMetre(double hz) => null;
}

/// <summary>A part with two ends.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="From">Node of the first end.</param>
/// <param name="To">Node of the second end.</param>
public abstract record TwoTerminalPart(string Name, string From, string To) : Part(Name)
{
    /// <inheritdoc/>
    public override IReadOnlyList<string> Nodes => [From, To];
}

/// <summary>A resistor. With the role <see cref="PartRole.Regeneration"/> its value comes from the control.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="From">Node of the first end.</param>
/// <param name="To">Node of the second end.</param>
/// <param name="Ohm">Resistance in ohm, above 0.</param>
public sealed record Resistor(string Name, string From, string To, double Ohm) : TwoTerminalPart(Name, From, To);

/// <summary>A capacitor with a constant loss tangent. With the role <see cref="PartRole.Tuning"/> its value comes from the dial.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="From">Node of the first end.</param>
/// <param name="To">Node of the second end.</param>
/// <param name="Farad">Capacitance in farad, above 0.</param>
/// <param name="Q">One over the loss tangent, above 0; null for a loss-free capacitor.</param>
public sealed record Capacitor(string Name, string From, string To, double Farad, double? Q = null) : TwoTerminalPart(Name, From, To);

/// <summary>A single inductor without coupling to another.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="From">Node of the first end.</param>
/// <param name="To">Node of the second end.</param>
/// <param name="Henry">Inductance in henry, above 0.</param>
/// <param name="SeriesOhm">Constant series resistance in ohm, from 0; it also carries direct current.</param>
/// <param name="Q">Constant Q adding w L/Q in series at alternating current, above 0; null for none.</param>
public sealed record Inductor(string Name, string From, string To, double Henry, double SeriesOhm = 0, double? Q = null)
    : TwoTerminalPart(Name, From, To);

/// <summary>A ferrite bead as resistance, inductance and capacitance in parallel.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="From">Node of the first end.</param>
/// <param name="To">Node of the second end.</param>
/// <param name="Ohm">Resistance in ohm, above 0.</param>
/// <param name="Henry">Inductance in henry, above 0.</param>
/// <param name="Farad">Capacitance in farad, from 0.</param>
public sealed record Bead(string Name, string From, string To, double Ohm, double Henry, double Farad) : TwoTerminalPart(Name, From, To);

/// <summary>A direct voltage behind a resistance. <c>From</c> is the positive end.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="From">Node of the positive end.</param>
/// <param name="To">Node of the negative end.</param>
/// <param name="Volt">Voltage in volt, any sign.</param>
/// <param name="SeriesOhm">Internal resistance in ohm, from 0.</param>
public sealed record Supply(string Name, string From, string To, double Volt, double SeriesOhm) : TwoTerminalPart(Name, From, To);

/// <summary>The electromotive force an antenna picks up: the input that every response is counted from.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="From">Node of the live end.</param>
/// <param name="To">Node of the return end.</param>
public sealed record Antenna(string Name, string From, string To) : TwoTerminalPart(Name, From, To)
{
    /// <summary>The wire that the parts behind it stand for; null where none is described.</summary>
    public WireOverGround? Wire { get; init; }

    /// <inheritdoc/>
    public override IReadOnlyList<Caution> CautionsAt(double hz) => Wire?.CautionsAt(hz) ?? [];

    /// <inheritdoc/>
    public override double? EffectiveHeightMetre(double hz) => Wire?.EffectiveHeightMetre(hz);
}

/// <summary>
/// An ideal feedback element: the current <c>Siemens x Factor x (v(SenseFrom) - v(SenseTo))</c> flows into the node
/// <c>OutTo</c> out of <c>OutFrom</c>. With the role <see cref="PartRole.Regeneration"/> the factor comes from the
/// control, and the element is then also the regenerating device.
/// </summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="SenseFrom">Positive sensing node.</param>
/// <param name="SenseTo">Negative sensing node.</param>
/// <param name="OutFrom">Node the current is taken out of.</param>
/// <param name="OutTo">Node the current is driven into.</param>
/// <param name="Siemens">Transconductance in siemens.</param>
/// <param name="Factor">Dimensionless feedback factor.</param>
public sealed record Feedback(string Name, string SenseFrom, string SenseTo, string OutFrom, string OutTo, double Siemens, double Factor)
    : Part(Name)
{
    /// <inheritdoc/>
    public override IReadOnlyList<string> Nodes => [SenseFrom, SenseTo, OutFrom, OutTo];
}

/// <summary>A bipolar transistor of a type from the shelf.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="Base">Node of the base lead.</param>
/// <param name="Collector">Node of the collector lead.</param>
/// <param name="Emitter">Node of the emitter lead.</param>
/// <param name="Model">The type's figures.</param>
public sealed record Bipolar(string Name, string Base, string Collector, string Emitter, BipolarModel Model) : Part(Name)
{
    /// <inheritdoc/>
    public override IReadOnlyList<string> Nodes => [Base, Collector, Emitter];
}

/// <summary>A diode of a type from the shelf.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="Anode">Node of the anode lead.</param>
/// <param name="Cathode">Node of the cathode lead.</param>
/// <param name="Model">The type's figures.</param>
public sealed record Diode(string Name, string Anode, string Cathode, DiodeModel Model) : Part(Name)
{
    /// <inheritdoc/>
    public override IReadOnlyList<string> Nodes => [Anode, Cathode];
}

/// <summary>Coupled windings: the sections of <paramref name="Model"/> in order, each between two nodes.</summary>
/// <param name="Name">The builder's name of the part.</param>
/// <param name="SectionNodes">Start and end node of every section, as many as the model has sections.</param>
/// <param name="Model">Inductance matrix and loss of the sections.</param>
public sealed record Windings(string Name, IReadOnlyList<(string From, string To)> SectionNodes, IWindingModel Model) : Part(Name)
{
    /// <inheritdoc/>
    public override IReadOnlyList<string> Nodes => [.. SectionNodes.SelectMany(s => new[] { s.From, s.To }).Distinct()];

    /// <summary>The part of the antenna's electromotive force that arises in the sections; null where the windings are no antenna.</summary>
    public CoilPickUp? PickUp { get; init; }

    /// <inheritdoc/>
    public override IReadOnlyList<Caution> CautionsAt(double hz) => Model.CautionsAt(hz);

    /// <inheritdoc/>
    public override double? EffectiveHeightMetre(double hz) => PickUp?.EffectiveHeightMetre(hz);
}
