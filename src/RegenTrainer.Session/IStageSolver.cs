using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>A stage that answers what a live view of it asks. Every answer is a function of the setting alone.</summary>
public interface IStageSolver
{
    /// <summary>The stage's title as its builder wrote it.</summary>
    string Title { get; }

    /// <summary>The dial: band, raster and capacitor.</summary>
    Dial Dial { get; }

    /// <summary>The regeneration control; null where the stage has none.</summary>
    RegenerationControl? Control { get; }

    /// <summary>Nominal supply in volt; null where the stage has none.</summary>
    double? SupplyVolt { get; }

    /// <summary>Whether the regenerating device comes in grades.</summary>
    bool HasGrades { get; }

    /// <summary>Another solver of the same stage, for another thread.</summary>
    IStageSolver Fork();

    /// <summary>The run along the dial at frequencies in Hz.</summary>
    IReadOnlyList<DialPoint> AlongDial(Setting setting, IReadOnlyList<double> dialHz);

    /// <summary>How audio frequencies in Hz fare; empty above tip-over, out of reach or unsolved.</summary>
    IReadOnlyList<Sideband> Sidebands(Setting setting, IReadOnlyList<double> audioHz);

    /// <summary>How regeneration, dial and station act on each other.</summary>
    Interaction Interaction(Setting setting);

    /// <summary>The operating point.</summary>
    BiasReading Bias(Setting setting);

    /// <summary>How far the stage can be driven.</summary>
    HeadroomReading Headroom(Setting setting);

    /// <summary>A setting without what does not suit this stage: a device of another polarity, a supply where there is none.</summary>
    Setting Fit(Setting setting);

    /// <summary>Everything computed for one setting; where a solve fails the figures are null and a caution says why.</summary>
    Reading Read(Setting setting);

    /// <summary>The response at frequencies in Hz; empty above tip-over, out of reach or unsolved.</summary>
    IReadOnlyList<ResponsePoint> Response(Setting setting, IReadOnlyList<double> hz);

    /// <summary>The neighbours on the raster; empty above tip-over, out of reach or unsolved.</summary>
    IReadOnlyList<Neighbour> Neighbours(Setting setting);

    /// <summary>What the stage does along the travel, whatever the setting's own; empty where that cannot be said.</summary>
    IReadOnlyList<RegimeSpan> RegimesAlongTravel(Setting setting);
}
