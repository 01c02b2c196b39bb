using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Core.Stages.Expansion;

/// <summary>Which nodes hang together through parts that a current can pass.</summary>
internal sealed class NodeGroups
{
    private readonly Dictionary<string, string> _parents = new(StringComparer.Ordinal);

    /// <summary>
    /// Joins the nodes of a part. Coupled windings join only the ends of each section, and an ideal feedback element joins
    /// nothing: its current fixes no voltage.
    /// </summary>
    public void Join(Part part)
    {
        switch (part)
        {
            case Windings windings:
                foreach ((string from, string to) in windings.SectionNodes)
                {
                    Join(from, to);
                }

                break;
            case Feedback:
                break;
            default:
                for (int i = 1; i < part.Nodes.Count; i++)
                {
                    Join(part.Nodes[0], part.Nodes[i]);
                }

                break;
        }
    }

    /// <summary>Whether a node hangs together with earth.</summary>
    public bool AtEarth(string node) => Root(node) == Root(Part.Earth);

    private void Join(string one, string other) => _parents[Root(one)] = Root(other);

    private string Root(string node)
    {
        while (_parents.TryGetValue(node, out string? parent) && parent != node)
        {
            node = parent;
        }

        return node;
    }
}
