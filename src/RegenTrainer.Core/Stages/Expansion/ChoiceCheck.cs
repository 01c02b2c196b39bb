using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Stages.Expansion;

/// <summary>Whether a design gives what its choices ask for, and nothing that has no meaning with them.</summary>
internal static class ChoiceCheck
{
    /// <summary>Adds a fault for every value that is missing or that belongs to another choice.</summary>
    /// <returns>Whether all that is needed is there.</returns>
    public static bool Check(StageDesign design, FaultList faults)
    {
        bool complete = true;
        foreach (Field field in design.Family.Fields.Where(f => f.OnlyWith is not null || f.RequiredWith is not null))
        {
            if (field.OnlyWith is { } only && design.Gives(field.Key) && !only.Holds(design.WordOrNull))
            {
                faults.Add(
                    field.Key,
                    $"{field.Key} with {only.Key} = \"{design.WordOrNull(only.Key)}\"",
                    $"it with {only.Phrase} alone");
            }

            if (field.IsRequired(design.WordOrNull) && !design.Gives(field.Key))
            {
                complete = false;
                faults.Add(field.Key, $"no {field.Key}", field.ExpectedWith(design.WordOrNull));
            }
        }

        return complete;
    }
}
