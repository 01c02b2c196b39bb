using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Core.Stages.Expansion;

/// <summary>The parts of a stage while it is being expanded. A value of null or 0 means that the part is left out.</summary>
internal sealed class PartList
{
    private readonly List<Part> _parts = [];

    /// <summary>The parts so far, in the order they were added.</summary>
    public IReadOnlyList<Part> Parts => _parts;

    /// <summary>Adds a part.</summary>
    public void Add(Part part) => _parts.Add(part);

    /// <summary>Adds parts.</summary>
    public void AddRange(IEnumerable<Part> parts) => _parts.AddRange(parts);

    /// <summary>Adds a resistor across two nodes, where it has a value.</summary>
    public void AddResistor(string name, string from, string to, double? ohm)
    {
        if (ohm > 0)
        {
            Add(new Resistor(name, from, to, ohm.Value));
        }
    }

    /// <summary>Adds a capacitor across two nodes, where it has a value.</summary>
    public void AddCapacitor(string name, string from, string to, double? farad)
    {
        if (farad > 0)
        {
            Add(new Capacitor(name, from, to, farad.Value));
        }
    }

    /// <summary>Goes on from a node through a resistor; left out, the way goes on at the same node.</summary>
    /// <returns>The node behind the resistor.</returns>
    public string ThroughResistor(string name, string from, double? ohm, string behind)
    {
        if (ohm > 0)
        {
            Add(new Resistor(name, from, behind, ohm.Value));
            return behind;
        }

        return from;
    }

    /// <summary>Goes on from a node through a capacitor; left out, the way goes on at the same node.</summary>
    /// <returns>The node behind the capacitor.</returns>
    public string ThroughCapacitor(string name, string from, double? farad, string behind)
    {
        if (farad > 0)
        {
            Add(new Capacitor(name, from, behind, farad.Value));
            return behind;
        }

        return from;
    }

    /// <summary>Goes on from a node through a lead; left out, the way goes on at the same node.</summary>
    /// <returns>The node behind the lead.</returns>
    public string ThroughLead(string name, string from, double? henry, string behind)
    {
        if (henry > 0)
        {
            Add(new Inductor(name, from, behind, henry.Value));
            return behind;
        }

        return from;
    }
}
