using System.Collections.Frozen;
using RegenTrainer.Core.Stages.Expansion;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Stages;

/// <summary>A circuit family: declares its fields once and expands a design into parts at nodes.</summary>
public abstract class Family
{
    private readonly FrozenDictionary<string, Field> _byKey;

    /// <summary>Declares a family.</summary>
    /// <param name="name">The word after <c>circuit =</c> in a stage file.</param>
    /// <param name="meaning">A sentence that says what such a stage is.</param>
    /// <param name="fields">Every value a stage of this family has.</param>
    protected Family(string name, string meaning, IReadOnlyList<Field> fields)
    {
        Name = name;
        Meaning = meaning;
        Fields = fields;
        _byKey = fields.ToFrozenDictionary(f => f.Key, StringComparer.Ordinal);
    }

    /// <summary>The word after <c>circuit =</c> in a stage file.</summary>
    public string Name { get; }

    /// <summary>A sentence that says what such a stage is.</summary>
    public string Meaning { get; }

    /// <summary>Every value a stage of this family has, in the order of the documentation.</summary>
    public IReadOnlyList<Field> Fields { get; }

    /// <summary>The field of a dotted key; null where the family has none.</summary>
    public Field? FieldFor(string key) => _byKey.GetValueOrDefault(key);

    /// <summary>
    /// Every reason why this design cannot be built that the single fields do not show (a tap beyond the coil, a band upside
    /// down, a node that floats). Single values are within their fields' ranges already.
    /// </summary>
    public abstract IReadOnlyList<FieldFault> Check(StageDesign design);

    /// <summary>
    /// The values that the design's choices ask for and that are missing, and those that have no meaning with its choices: the
    /// part of <see cref="Check"/> that can be told of any design.
    /// </summary>
    public static IReadOnlyList<FieldFault> CheckChoices(StageDesign design)
    {
        FaultList faults = new();
        ChoiceCheck.Check(design, faults);
        return faults.Faults;
    }

    /// <summary>The design as parts at nodes. The design has passed <see cref="Check"/>.</summary>
    public abstract StageCircuit Expand(StageDesign design);
}
