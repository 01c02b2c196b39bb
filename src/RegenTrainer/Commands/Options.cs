using System.CommandLine;
using System.CommandLine.Parsing;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Commands;

/// <summary>Makes options whose values are typed as the trade writes them, with messages that name option, found and expected.</summary>
internal static class Options
{
    /// <summary>An option that takes a quantity.</summary>
    /// <param name="name">The option, with its hyphens.</param>
    /// <param name="unit">What it measures.</param>
    /// <param name="minimum">Smallest value, inclusive.</param>
    /// <param name="maximum">Largest value, inclusive.</param>
    /// <param name="valueName">What the help calls the value.</param>
    /// <param name="meaning">The help's line.</param>
    public static Option<double?> Quantity(string name, Unit unit, double minimum, double maximum, string valueName, string meaning) =>
        new(name)
        {
            HelpName = valueName,
            Description = meaning,
            Arity = ArgumentArity.ExactlyOne,
            CustomParser = result => ReadQuantity(result, name, result.Tokens[0].Value, unit, minimum, maximum),
        };

    /// <summary>An option that takes several quantities with commas between them.</summary>
    public static Option<double[]?> Quantities(
        string name, Unit unit, double minimum, double maximum, int most, string valueName, string meaning) =>
        new(name)
        {
            HelpName = valueName,
            Description = meaning,
            Arity = ArgumentArity.ExactlyOne,
            CustomParser = result =>
            {
                string[] texts = result.Tokens[0].Value.Split(',');
                if (texts.Length > most)
                {
                    result.AddError($"{name}: found {texts.Length} values, expected at most {most}");
                    return null;
                }

                double?[] values = [.. texts.Select(text => ReadQuantity(result, name, text, unit, minimum, maximum))];
                return Array.TrueForAll(values, v => v is not null) ? Array.ConvertAll(values, v => v!.Value) : null;
            },
        };

    /// <summary>An option that takes one of a few words.</summary>
    public static Option<T?> Choice<T>(string name, IReadOnlyDictionary<string, T> words, string meaning)
        where T : struct
    {
        var option = new Option<T?>(name)
        {
            HelpName = string.Join('|', words.Keys),
            Description = meaning,
            Arity = ArgumentArity.ExactlyOne,
            CustomParser = result =>
            {
                string text = result.Tokens[0].Value;
                if (words.TryGetValue(text, out T value))
                {
                    return value;
                }

                result.AddError($"{name}: found \"{Shown(text)}\", expected {string.Join(" or ", words.Keys)}");
                return null;
            },
        };
        option.CompletionSources.Clear();
        option.CompletionSources.Add([.. words.Keys]);
        return option;
    }

    /// <summary>Text of an argument, fit for a message of one line.</summary>
    public static string Shown(string text) => Printable.Fit(text, 60);

    private static double? ReadQuantity(ArgumentResult result, string name, string text, Unit unit, double minimum, double maximum)
    {
        if (!QuantityText.TryRead(text, unit, out double value, out QuantityFault fault))
        {
            result.AddError($"{name}: in \"{Shown(text)}\" at character {fault.Offset + 1}: {Printable.Text(fault.Message)}");
            return null;
        }

        if (value >= minimum && value <= maximum)
        {
            return value;
        }

        result.AddError(
            $"{name}: found {QuantityText.Write(value, unit, 6)}, expected {QuantityText.Write(minimum, unit, 6)} to "
            + QuantityText.Write(maximum, unit, 6));
        return null;
    }
}
