using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>The coil of a design being worked on, at the dial and in the room as they are.</summary>
/// <param name="workbench">The design.</param>
public sealed class CoilFigures(Workbench workbench)
{
    private (StageModel Model, double Hz, double Celsius)? _at;
    private CoilReading? _reading;

    /// <summary>The coil now; null where the design has none. Read anew only where something has changed.</summary>
    public CoilReading? Now
    {
        get
        {
            (StageModel Model, double Hz, double Celsius) at =
                (workbench.Model, workbench.Stage.Setting.DialHz, workbench.Stage.Setting.TemperatureCelsius);
            if (_at != at)
            {
                (_at, _reading) = (at, CoilReader.TryRead(at.Model.Network.Parts, at.Hz, at.Celsius));
            }

            return _reading;
        }
    }
}
