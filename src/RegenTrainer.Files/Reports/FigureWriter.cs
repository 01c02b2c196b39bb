using System.Text.Json;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Files.Reports;

/// <summary>Writes keys and figures into an answer; what is not finite becomes null and is remembered by its key.</summary>
internal sealed class FigureWriter
{
    private readonly Utf8JsonWriter _json;
    private readonly List<string> _notFinite = [];

    public FigureWriter(Utf8JsonWriter json) => _json = json;

    /// <summary>The keys whose figures were not finite, in the order they were met.</summary>
    public IReadOnlyList<string> NotFinite => _notFinite;

    public void Number(string key, double? value)
    {
        _json.WritePropertyName(key);
        Value(key, value);
    }

    public void Word(string key, string? word)
    {
        if (word is null)
        {
            _json.WriteNull(key);
        }
        else
        {
            _json.WriteString(key, Printable.Text(word));
        }
    }

    public void Whole(string key, int? value)
    {
        if (value is { } number)
        {
            _json.WriteNumber(key, number);
        }
        else
        {
            _json.WriteNull(key);
        }
    }

    public void Flag(string key, bool value) => _json.WriteBoolean(key, value);

    public void Nothing(string key) => _json.WriteNull(key);

    /// <summary>An object under a key.</summary>
    public void Group(string key, Action<FigureWriter> write)
    {
        _json.WriteStartObject(key);
        write(this);
        _json.WriteEndObject();
    }

    /// <summary>An array of objects under a key.</summary>
    public void List<T>(string key, IEnumerable<T> items, Action<FigureWriter, T> write)
    {
        _json.WriteStartArray(key);
        foreach (T item in items)
        {
            _json.WriteStartObject();
            write(this, item);
            _json.WriteEndObject();
        }

        _json.WriteEndArray();
    }

    /// <summary>An array of rows of numbers under a key.</summary>
    public void Matrix(string key, IReadOnlyList<IReadOnlyList<double>> rows)
    {
        _json.WriteStartArray(key);
        foreach (IReadOnlyList<double> row in rows)
        {
            _json.WriteStartArray();
            foreach (double value in row)
            {
                Value(key, value);
            }

            _json.WriteEndArray();
        }

        _json.WriteEndArray();
    }

    private void Value(string key, double? value)
    {
        if (value is { } number && double.IsFinite(number))
        {
            _json.WriteNumberValue(number);
            return;
        }

        _json.WriteNullValue();
        if (value is not null && !_notFinite.Contains(key, StringComparer.Ordinal))
        {
            _notFinite.Add(key);
        }
    }
}
