namespace RegenTrainer.Core.Circuits;

/// <summary>What can pass between two nodes that a part joins.</summary>
internal enum JoinKind
{
    /// <summary>Direct and alternating current.</summary>
    Direct,

    /// <summary>Alternating current alone.</summary>
    Alternating,

    /// <summary>Both, while the regenerating device is in its socket.</summary>
    RegeneratingDirect,
}

/// <summary>Which unknowns the parts of a circuit join; -1 is earth.</summary>
internal sealed class Joins
{
    private readonly List<(int A, int B, JoinKind Kind)> _joins = [];

    /// <summary>Joins two unknowns.</summary>
    public void Add(int a, int b, JoinKind kind) => _joins.Add((a, b, kind));

    /// <summary>One node of each island that no path joins to earth.</summary>
    /// <param name="unknowns">Number of unknowns.</param>
    /// <param name="branches">The unknowns that are no nodes.</param>
    /// <param name="counts">Which joins make a path.</param>
    public IReadOnlyList<int> Islands(int unknowns, HashSet<int> branches, Func<JoinKind, bool> counts)
    {
        int[] parent = [.. Enumerable.Range(0, unknowns + 1)];   // the last one is earth
        int Root(int i)
        {
            while (parent[i] != i)
            {
                i = parent[i] = parent[parent[i]];
            }

            return i;
        }

        foreach ((int a, int b, JoinKind kind) in _joins)
        {
            if (counts(kind))
            {
                parent[Root(a < 0 ? unknowns : a)] = Root(b < 0 ? unknowns : b);
            }
        }

        return [.. Enumerable.Range(0, unknowns).Where(i => !branches.Contains(i)).GroupBy(Root)
            .Where(g => g.Key != Root(unknowns)).Select(g => g.First())];
    }
}
