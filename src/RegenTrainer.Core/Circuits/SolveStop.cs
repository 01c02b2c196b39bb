namespace RegenTrainer.Core.Circuits;

/// <summary>Why a solver stopped.</summary>
public enum SolveStop
{
    /// <summary>It met its tolerance.</summary>
    Converged,

    /// <summary>The allowed number of steps was used up.</summary>
    StepLimit,

    /// <summary>The equations are singular; the result names where.</summary>
    Singular,

    /// <summary>A value became infinite or not a number.</summary>
    NotFinite,

    /// <summary>The mode found is not the one followed.</summary>
    ModeLost,

    /// <summary>The capacitor does not reach the frequency asked for.</summary>
    OutOfReach,
}
