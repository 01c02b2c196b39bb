namespace RegenTrainer.Core.Regeneration;

/// <summary>How often the stage tips over along the travel.</summary>
public enum TipOverState
{
    /// <summary>It never oscillates.</summary>
    Never,

    /// <summary>It oscillates at every travel.</summary>
    Always,

    /// <summary>It tips over once.</summary>
    Once,

    /// <summary>It crosses into or out of oscillation several times.</summary>
    Several,
}

/// <summary>One crossing of the threshold of oscillation.</summary>
/// <param name="Value">The control element's value there, in its own unit.</param>
/// <param name="TravelPercent">The travel there, 0 to 100 %.</param>
/// <param name="Degrees">The mechanical angle there, in degrees from the idle stop.</param>
/// <param name="Upward">True where more travel means oscillation.</param>
/// <param name="FrequencyHz">Frequency at the threshold in Hz.</param>
/// <param name="TuningFarad">Tuning capacitor at the threshold in farad.</param>
public readonly record struct Crossing(
    double Value, double TravelPercent, double Degrees, bool Upward, double FrequencyHz, double TuningFarad);

/// <summary>All crossings along the travel, upward in travel.</summary>
/// <param name="State">How often the stage tips over.</param>
/// <param name="Crossings">Each crossing in order of travel.</param>
public sealed record TipOver(TipOverState State, IReadOnlyList<Crossing> Crossings)
{
    /// <summary>The first upward crossing; null where there is none.</summary>
    public Crossing? First
    {
        get
        {
            foreach (Crossing crossing in Crossings)
            {
                if (crossing.Upward)
                {
                    return crossing;
                }
            }

            return null;
        }
    }
}
