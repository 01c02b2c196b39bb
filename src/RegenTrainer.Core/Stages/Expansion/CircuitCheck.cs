using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Stages.Expansion;

/// <summary>What is wrong with parts at nodes, whatever family they come from.</summary>
internal static class CircuitCheck
{
    /// <summary>Most parts of a stage.</summary>
    public const int MaximumParts = 500;

    /// <summary>Most nodes of a stage beside earth.</summary>
    public const int MaximumNodes = 200;

    /// <summary>The key an output node stands at.</summary>
    public const string OutputKey = "output.node";

    /// <summary>Adds a fault for every reason why the parts make no stage.</summary>
    /// <param name="parts">All parts of the stage.</param>
    /// <param name="outputNode">The output node; null where none is named.</param>
    /// <param name="faults">Where the faults go.</param>
    public static void Check(IReadOnlyList<Part> parts, string? outputNode, FaultList faults)
    {
        if (parts.Count > MaximumParts)
        {
            faults.Add(Key(parts[MaximumParts]), $"{parts.Count} parts", $"at most {MaximumParts} in a stage");
            return;
        }

        int nodes = parts.SelectMany(p => p.Nodes).Where(n => n != Part.Earth).Distinct(StringComparer.Ordinal).Count();
        if (nodes > MaximumNodes)
        {
            faults.Add(Key(parts[^1]), $"{nodes} nodes", $"at most {MaximumNodes} in a stage");
            return;
        }

        CheckNames(parts, faults);
        ValueCheck.Check(parts, faults);
        RoleCheck.Check(parts, faults);
        CheckOutput(parts, outputNode, faults);
        CheckFloating(parts, faults);
    }

    /// <summary>
    /// Expands a design whose values are sound and checks the parts; with faults in the values the expansion would mean nothing.
    /// </summary>
    public static void CheckExpansion(Family family, StageDesign design, FaultList faults)
    {
        if (faults.Faults.Count == 0)
        {
            StageCircuit circuit = family.Expand(design);
            Check(circuit.Parts, circuit.OutputNode, faults);
        }
    }

    /// <summary>The key of a part in a fault.</summary>
    public static string Key(Part part) => $"part:{part.Name}";

    private static void CheckNames(IReadOnlyList<Part> parts, FaultList faults)
    {
        HashSet<string> seen = new(StringComparer.Ordinal);
        foreach (Part part in parts)
        {
            if (!seen.Add(part.Name))
            {
                faults.Add(Key(part), $"a second part named \"{part.Name}\"", "a name of its own for every part");
            }
        }
    }

    private static void CheckOutput(IReadOnlyList<Part> parts, string? outputNode, FaultList faults)
    {
        if (outputNode is null)
        {
            faults.Missing(OutputKey, "the node the output is taken from");
            return;
        }

        if (outputNode == Part.Earth)
        {
            faults.Add(OutputKey, $"\"{Part.Earth}\"", "a node other than the reference");
            return;
        }

        switch (parts.Count(p => p.Nodes.Contains(outputNode, StringComparer.Ordinal)))
        {
            case 0:
                faults.Add(OutputKey, $"node \"{outputNode}\", which no part is connected to", "a node of the stage");
                break;
            case 1:
                faults.Add(OutputKey, $"node \"{outputNode}\" at the end of a single part", "a node where at least two parts meet");
                break;
            default:
                break;
        }
    }

    private static void CheckFloating(IReadOnlyList<Part> parts, FaultList faults)
    {
        NodeGroups groups = new();
        foreach (Part part in parts)
        {
            groups.Join(part);
        }

        HashSet<string> reported = new(StringComparer.Ordinal);
        foreach (Part part in parts)
        {
            foreach (string node in part.Nodes)
            {
                if (!groups.AtEarth(node) && reported.Add(node))
                {
                    faults.Add(Key(part), $"node \"{node}\", which no path through parts joins to earth", "a path to earth from every node");
                }
            }
        }
    }
}
