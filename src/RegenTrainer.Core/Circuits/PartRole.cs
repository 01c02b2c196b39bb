namespace RegenTrainer.Core.Circuits;

/// <summary>What a part does for the stage beyond being connected.</summary>
public enum PartRole
{
    /// <summary>An ordinary part.</summary>
    None,

    /// <summary>The capacitor the dial turns; its value comes from the tuning.</summary>
    Tuning,

    /// <summary>The element the regeneration control turns; its value comes from the control.</summary>
    Regeneration,

    /// <summary>The device in the feedback path: the one taken out of its socket for "regeneration off".</summary>
    Regenerating,
}
