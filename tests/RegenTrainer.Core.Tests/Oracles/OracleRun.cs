namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>What a carrier-level run is to do. All sources start from nothing at time 0.</summary>
/// <param name="StepSeconds">Step in seconds; a 120th of a cycle or less.</param>
/// <param name="Steps">Number of steps.</param>
internal sealed record OracleRun(double StepSeconds, int Steps)
{
    /// <summary>Electromotive force of every antenna in volt at a time in seconds; null for none.</summary>
    internal Func<double, double>? AntennaVolt { get; init; }

    /// <summary>Current driven through the tank from outside, in ampere at a time in seconds; null for none.</summary>
    internal Func<double, double>? KickAmpere { get; init; }

    /// <summary>Whether devices stay linear about the operating point.</summary>
    internal bool Linear { get; init; }

    /// <summary>Every how many steps a sample is kept, 1 or more.</summary>
    internal int Every { get; init; } = 1;

    /// <summary>Names of the nodes whose voltage is kept.</summary>
    internal IReadOnlyList<string> Nodes { get; init; } = [];

    /// <summary>Names of the branches whose current is kept: inductors, sources, sections as <c>name:index</c>.</summary>
    internal IReadOnlyList<string> Branches { get; init; } = [];
}

/// <summary>The samples of a run: sample k of a series belongs to time (k + 1) x Every x step.</summary>
/// <param name="Volt">Node voltages in volt, the operating point included.</param>
/// <param name="Ampere">Branch currents in ampere, the operating point included.</param>
internal sealed record OracleSamples(IReadOnlyDictionary<string, double[]> Volt, IReadOnlyDictionary<string, double[]> Ampere);
