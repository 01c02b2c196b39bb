using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;

namespace RegenTrainer.Screens;

/// <summary>Says in words where two designs differ.</summary>
internal static class DesignChange
{
    /// <summary>The first value that differs, and how many more do.</summary>
    public static string Words(StageDesign before, StageDesign now)
    {
        List<Field> changed =
        [
            .. now.Family.Fields.Where(field => PartValue.Shown(field, before) != PartValue.Shown(field, now) || before.Gives(field.Key) != now.Gives(field.Key)),
        ];
        if (changed.Count == 0)
        {
            return "a tolerance";
        }

        string more = changed.Count > 1 ? $" and {changed.Count - 1} more" : "";
        return $"{changed[0].Key} is {PartValue.Shown(changed[0], now)}, was {PartValue.Shown(changed[0], before)}{more}";
    }
}
