using RegenTrainer.Files;
using RegenTrainer.Session.Keeping;

namespace RegenTrainer.Session;

/// <summary>What a session needs of the machine it runs on.</summary>
/// <param name="Places">Where the user's own is kept.</param>
/// <param name="Clock">The time.</param>
/// <param name="Process">The process the session is known by.</param>
public sealed record Surroundings(Places Places, TimeProvider Clock, ProcessMark Process)
{
    /// <summary>Those of the user and the process this runs in.</summary>
    public static Surroundings OfUser() => new(Places.OfUser(), TimeProvider.System, ProcessMark.Own);
}
