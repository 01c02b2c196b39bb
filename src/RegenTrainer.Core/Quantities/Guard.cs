using System.Globalization;

namespace RegenTrainer.Core.Quantities;

/// <summary>Checks of construction values. Each hands back the value it let pass; none lets NaN or infinity pass.</summary>
public static class Guard
{
    /// <summary>Lets a value pass that lies in a closed interval.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value lies outside, is infinite or not a number.</exception>
    public static double InRange(double value, double minimum, double maximum, string name) =>
        double.IsFinite(value) && value >= minimum && value <= maximum
            ? value
            : throw Outside(Say(value), $"from {Say(minimum)} to {Say(maximum)}", name);

    /// <summary>Lets a whole number pass that lies in a closed interval.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value lies outside.</exception>
    public static int InRange(int value, int minimum, int maximum, string name) =>
        value >= minimum && value <= maximum
            ? value
            : throw Outside(Say(value), $"from {Say(minimum)} to {Say(maximum)}", name);

    /// <summary>Lets a finite value above zero pass.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is zero, negative, infinite or not a number.</exception>
    public static double Positive(double value, string name) =>
        double.IsFinite(value) && value > 0.0 ? value : throw Outside(Say(value), "finite and above 0", name);

    /// <summary>Lets a whole number above zero pass.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is zero or negative.</exception>
    public static int Positive(int value, string name) =>
        value > 0 ? value : throw Outside(Say(value), "1 or more", name);

    /// <summary>Lets a finite value of zero or more pass.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is negative, infinite or not a number.</exception>
    public static double NotNegative(double value, string name) =>
        double.IsFinite(value) && value >= 0.0 ? value : throw Outside(Say(value), "finite and 0 or more", name);

    /// <summary>Lets a whole number of zero or more pass.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is negative.</exception>
    public static int NotNegative(int value, string name) =>
        value >= 0 ? value : throw Outside(Say(value), "0 or more", name);

    /// <summary>Lets any finite value pass.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is infinite or not a number.</exception>
    public static double Finite(double value, string name) =>
        double.IsFinite(value) ? value : throw Outside(Say(value), "finite", name);

    private static ArgumentOutOfRangeException Outside(string value, string allowed, string name) =>
        new(name, $"{name} is {value}; it must be {allowed}.");

    private static string Say(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    private static string Say(int value) => value.ToString(CultureInfo.InvariantCulture);
}
