using System.Numerics;
using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Core.Tuning;

/// <summary>The tank at one query; voltages, linearisations and shapes stand in the workspace.</summary>
/// <param name="Bias">Outcome of the operating point.</param>
/// <param name="Mode">Outcome of the tank mode.</param>
public readonly record struct TankState(OperatingPoint Bias, ModeResult Mode)
{
    /// <summary>Whether both were found.</summary>
    public bool Found => Bias.Found && Mode.Found;

    /// <summary>Why the solve stopped: the operating point's reason first.</summary>
    public SolveStop Stop => Bias.Found ? Mode.Stop : Bias.Stop;
}

/// <summary>A known tank nearby, whose shapes and voltages still stand in the workspace. It saves time and changes no result.</summary>
/// <param name="Valid">Whether there is one.</param>
/// <param name="S">Its natural frequency in 1/s.</param>
/// <param name="TuningFarad">Its tuning capacitor in farad.</param>
public readonly record struct TankHint(bool Valid, Complex S, double TuningFarad)
{
    /// <summary>No hint.</summary>
    public static readonly TankHint None;

    /// <summary>The state just solved as a hint for the next.</summary>
    public static TankHint From(in TankState state) => new(state.Found, state.Mode.S, state.Mode.TuningFarad);
}
