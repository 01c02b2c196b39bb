using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>Passive networks drawn from a fixed seed: connected, every node with a resistor somewhere near.</summary>
internal static class RandomNetworks
{
    public static IReadOnlyList<Part> Draw(int seed)
    {
        var random = new CounterRandom(seed);
        int nodes = 2 + (int)(random.Next() * 8);
        var parts = new List<Part>();
        string Node(int i) => i == 0 ? Part.Earth : $"n{i}";
        for (int i = 1; i <= nodes; i++)
        {
            // a tree keeps everything joined to earth, by a resistor now and then
            parts.Add(Element(random, $"tree {i}", Node(i), Node((int)(random.Next() * i))));
            parts.Add(new Resistor($"leak {i}", Node(i), Part.Earth, random.NextLog(1e2, 1e6)));
        }

        for (int k = 0; k < 2 * nodes; k++)
        {
            int a = (int)(random.Next() * (nodes + 1)), b = (int)(random.Next() * (nodes + 1));
            if (a != b)
            {
                parts.Add(Element(random, $"part {k}", Node(a), Node(b)));
            }
        }

        return parts;
    }

    private static TwoTerminalPart Element(CounterRandom random, string name, string from, string to) => (int)(random.Next() * 5) switch
    {
        0 => new Resistor(name, from, to, random.NextLog(1, 1e6)),
        1 => new Capacitor(name, from, to, random.NextLog(1e-12, 1e-8)),
        2 => new Capacitor(name, from, to, random.NextLog(1e-12, 1e-8), random.NextLog(20, 2000)),
        3 => new Inductor(name, from, to, random.NextLog(1e-7, 1e-3), random.NextLog(0.01, 10), random.NextLog(20, 500)),
        _ => new Bead(name, from, to, random.NextLog(10, 1000), random.NextLog(1e-7, 1e-5), 1e-12),
    };
}
