using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;

namespace RegenTrainer.Core.Stages;

/// <summary>A design made ready for solving: its parts and its compiled network. Immutable; any number of threads may share it.</summary>
public sealed class StageModel
{
    private StageModel(StageDesign design, StageCircuit circuit, Network network)
    {
        (Design, Circuit, Network) = (design, circuit, network);
        OutputIndex = network.NodeIndex(circuit.OutputNode);
        RegeneratingType = network.Devices.FirstOrDefault(d => d.Regenerating)?.Model.Name;
    }

    /// <summary>The design.</summary>
    public StageDesign Design { get; }

    /// <summary>The design as parts at nodes.</summary>
    public StageCircuit Circuit { get; }

    /// <summary>The compiled network.</summary>
    public Network Network { get; }

    /// <summary>The unknown of the output node; -1 where the output is earth.</summary>
    public int OutputIndex { get; }

    /// <summary>The registered type in the regenerating socket; null where there is none.</summary>
    public string? RegeneratingType { get; }

    /// <summary>The law of the regeneration control; null where the stage has none.</summary>
    public IControlLaw? ControlLaw => Circuit.Control?.Law;

    /// <summary>Compiles a checked design.</summary>
    /// <exception cref="InvalidOperationException">The design was not checked: a node floats or two roles clash.</exception>
    public static StageModel Compile(StageDesign design)
    {
        StageCircuit circuit = design.Family.Expand(design);
        return new StageModel(design, circuit, Network.Compile(circuit.Parts));
    }
}
