namespace RegenTrainer.Core.Stages.Families;

/// <summary>All circuit families.</summary>
public static class FamilyList
{
    /// <summary>The families, in the order of the documentation.</summary>
    public static IReadOnlyList<Family> All { get; } = [TappedCoil.Instance, PlainTank.Instance, PartsCircuit.Instance];

    /// <summary>The family of the word after <c>circuit =</c>; null where there is none.</summary>
    public static Family? ByName(string name) => All.FirstOrDefault(f => f.Name == name);
}
