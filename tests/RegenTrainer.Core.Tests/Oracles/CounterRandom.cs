namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>Repeatable random numbers from a seed: the SplitMix64 mixing of a counter [Steele, Lea and Flood 2014].</summary>
internal sealed class CounterRandom(long seed)
{
    private ulong _counter = unchecked((ulong)seed * 0x9E3779B97F4A7C15UL);

    /// <summary>A number from 0 up to but not including 1.</summary>
    public double Next()
    {
        unchecked
        {
            _counter += 0x9E3779B97F4A7C15UL;
            ulong z = _counter;
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9UL;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EBUL;
            return ((z ^ (z >> 31)) >> 11) * (1.0 / (1UL << 53));
        }
    }

    /// <summary>A number between -1 and 1.</summary>
    public double NextSigned() => (2 * Next()) - 1;

    /// <summary>A number spread evenly by ratio between two positive ends.</summary>
    public double NextLog(double low, double high) => low * Math.Pow(high / low, Next());
}
