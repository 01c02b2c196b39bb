using System.Globalization;

namespace RegenTrainer.Core.Quantities;

/// <summary>Reads one quantity from left to right and keeps the first fault.</summary>
internal sealed class QuantityReader(TypedText typed, Unit unit)
{
    private int _at = typed.Start;
    private string _sign = "";
    private string _whole = "";
    private string _fraction = "";
    private int _power;
    private bool _coded;

    /// <summary>Why the text could not be read.</summary>
    public QuantityFault Fault { get; private set; }

    private char Here => typed.At(_at);

    /// <summary>Reads the text; on a fault gives 0.</summary>
    public bool TryRead(out double value)
    {
        value = 0.0;
        if (unit == Unit.Metre && typed.Word(_at).StartsWith("AWG", StringComparison.OrdinalIgnoreCase))
        {
            return TryGauge(out value);
        }

        int start = _at;
        return TryNumber() && TryUnit() && TryCompose(start, out value);
    }

    private bool TryNumber()
    {
        if (Here is '-' or '+' or '\u2212')
        {
            _sign = Here == '+' ? "" : "-";
            _at++;
        }

        _whole = Digits();
        if (_whole.Length > 0 && Here == ',')
        {
            return Refuse(_at, "a comma", CommaAdvice());
        }

        if (Here == '.')
        {
            _at++;
            _fraction = Digits();
            if (_fraction.Length == 0)
            {
                return Refuse(_at, typed.Describe(_at), "a digit after the point");
            }

            return TryExponent();
        }

        if (char.IsAsciiDigit(typed.At(_at + 1)) && PointPower(Here) is int power)
        {
            if (unit == Unit.Metre && Here == 'm')
            {
                string length = (_whole.Length == 0 ? "0" : _whole) + "." + typed.Digits(_at + 1);
                return Refuse(_at, "`m` in the place of the point", $"{length} mm or {length} m");
            }

            _at++;
            _fraction = Digits();
            _power = power;
            _coded = true;
            return true;
        }

        return _whole.Length > 0 ? TryExponent() : Refuse(_at, typed.Describe(_at), UnitSigns.Example(unit));
    }

    private bool TryExponent()
    {
        if (Here is not ('e' or 'E'))
        {
            return true;
        }

        bool negative = typed.At(_at + 1) == '-';
        int first = typed.At(_at + 1) is '-' or '+' ? _at + 2 : _at + 1;
        if (!char.IsAsciiDigit(typed.At(first)))
        {
            return Refuse(first, typed.Describe(first), "the digits of a power of ten");
        }

        _at = first;
        string digits = Digits().TrimStart('0');

        // Six digits are far beyond any finite number already and still fit an int.
        int size = digits.Length > 6 ? 999999 : int.Parse("0" + digits, CultureInfo.InvariantCulture);
        _power = negative ? -size : size;
        return true;
    }

    /// <summary>Reads prefix and unit, of which either or both may be missing.</summary>
    private bool TryUnit()
    {
        int wordAt = typed.SkipBlanks(_at);
        if (wordAt == typed.End)
        {
            return true;
        }

        if (typed.Word(wordAt).StartsWith("meg", StringComparison.OrdinalIgnoreCase))
        {
            return Refuse(wordAt, $"`{typed.Word(wordAt)}`", "M for mega");
        }

        int furthest = AfterUnit(wordAt);
        if (furthest == typed.End)
        {
            return true;
        }

        int afterPrefix = wordAt;
        if (!_coded && UnitSigns.Power(typed.At(wordAt), unit) is int power)
        {
            // 10k ohm is one quantity; 5 m m is not.
            afterPrefix = wordAt == _at ? typed.SkipBlanks(wordAt + 1) : wordAt + 1;
            furthest = Math.Max(furthest, AfterUnit(afterPrefix));
            if (furthest == typed.End)
            {
                _power += power;
                return true;
            }
        }

        return RefuseUnit(wordAt, afterPrefix, furthest);
    }

    private bool RefuseUnit(int wordAt, int afterPrefix, int furthest)
    {
        // Any prefix may stand before a wrong unit, even where the wanted one takes none.
        int behindLetter = afterPrefix > wordAt ? afterPrefix : wordAt + 1;
        bool prefixed = UnitSigns.Power(typed.At(wordAt), Unit.Ohm) is not null;
        foreach (int at in prefixed ? [wordAt, behindLetter] : new[] { wordAt })
        {
            if (at < typed.End && UnitSigns.OtherUnit(typed.Word(at), unit) is Unit other)
            {
                return Refuse(at, UnitSigns.Name(other), UnitSigns.Name(unit));
            }
        }

        string expected = (furthest, typed.At(furthest)) switch
        {
            (_, 'P') when furthest == wordAt => "p for pico",
            (_, 'N') when furthest == wordAt => "n for nano",
            (_, 'U') when furthest == wordAt => "u for micro",
            (_, 'g') when furthest == wordAt => "G for giga",
            _ when furthest > Math.Max(wordAt, afterPrefix) || unit == Unit.None => "the end of the value",
            _ => UnitSigns.Name(unit) + " or the end of the value",
        };
        return Refuse(furthest, typed.Describe(furthest), expected);
    }

    private bool TryCompose(int start, out double value)
    {
        string mantissa = $"{_sign}{_whole.PadLeft(1, '0')}.{_fraction.PadRight(1, '0')}";
        string number = mantissa + "e" + _power.ToString(CultureInfo.InvariantCulture);
        value = double.Parse(number, NumberStyles.Float, CultureInfo.InvariantCulture);
        if (!double.IsFinite(value))
        {
            value = 0.0;
            return Refuse(start, "a number too large to hold", "a number below 1e308");
        }

        if (value == 0.0 && mantissa.AsSpan().ContainsAnyInRange('1', '9'))
        {
            return Refuse(start, "a number too small to tell from 0", "0 or a number above 1e-300");
        }

        return true;
    }

    private bool TryGauge(out double value)
    {
        value = 0.0;
        int numberAt = typed.SkipBlanks(_at + 3);
        _at = numberAt;
        string digits = Digits();
        const string Expected = "a wire number from 0000 to 40";
        if (digits.Length == 0)
        {
            return Refuse(_at, typed.Describe(_at), Expected);
        }

        if (_at != typed.End)
        {
            return Refuse(_at, typed.Describe(_at), "the end of the wire number");
        }

        bool zeros = digits.Trim('0').Length == 0;
        bool leading = digits[0] == '0' && !zeros;
        if (leading || digits.Length > (zeros ? 4 : 2))
        {
            return Refuse(numberAt, $"`{digits}`", Expected);
        }

        int number = zeros ? 1 - digits.Length : int.Parse(digits, CultureInfo.InvariantCulture);
        if (number > WireGauge.Highest)
        {
            return Refuse(numberAt, $"`{digits}`", Expected);
        }

        value = WireGauge.Diameter(number);
        return true;
    }

    /// <summary>What to write in place of a decimal comma, built from what was typed.</summary>
    private string CommaAdvice()
    {
        string after = typed.Digits(_at + 1);
        string rest = typed.From(_at + 1 + after.Length).ToString();
        string pointed = _sign + _whole + "." + after + rest;
        if (after.Length == 0 || !QuantityText.TryRead(pointed, unit, out double value, out _))
        {
            return "a point as decimal sign";
        }

        if (after.Length == 3 && _whole.Length <= 3)
        {
            // Three digits may have been meant as a thousand; neither reading is taken without asking.
            return $"a point (write {pointed}), or no mark between thousands (write {_sign}{_whole}{after}{rest})";
        }

        string code = QuantityText.WriteCode(value, unit, 15);
        return code == pointed ? $"a point (write {pointed})" : $"a point (write {pointed} or {code})";
    }

    private int? PointPower(char letter) =>
        UnitSigns.PointLetter(unit) == letter ? 0 : UnitSigns.Power(letter, unit);

    /// <summary>The place behind the longest spelling of the wanted unit at a place, or that place.</summary>
    private int AfterUnit(int at)
    {
        int longest = 0;
        foreach (string spelling in UnitSigns.Spellings(unit))
        {
            if (spelling.Length > longest && typed.From(at).StartsWith(spelling, StringComparison.Ordinal))
            {
                longest = spelling.Length;
            }
        }

        return at + longest;
    }

    private string Digits()
    {
        string digits = typed.Digits(_at);
        _at += digits.Length;
        return digits;
    }

    private bool Refuse(int at, string found, string expected)
    {
        Fault = new QuantityFault(at, Printable.Text(found), expected);
        return false;
    }
}
