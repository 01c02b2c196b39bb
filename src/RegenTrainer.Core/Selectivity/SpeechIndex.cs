namespace RegenTrainer.Core.Selectivity;

/// <summary>How much of speech the selectivity leaves: octave importance weights times audibility.</summary>
public static class SpeechIndex
{
    /// <summary>Octave band centres in Hz.</summary>
    public static readonly double[] BandCentresHz = [250, 500, 1000, 2000, 4000, 8000];

    /// <summary>Importance of the octave bands [ANSI S3.5-1997], from memory.</summary>
    private static readonly double[] _importance = [0.0617, 0.1671, 0.2373, 0.2648, 0.2142, 0.0549];

    /// <summary>A band is lost entirely at this loss in dB: the dynamic range of speech in the standard.</summary>
    private const double RangeDb = 30;

    /// <summary>The index of the filter alone, 0 (nothing left) to 1.</summary>
    /// <param name="audioDbAt">Audio response in dB at a frequency in Hz, relative to the carrier.</param>
    public static double Of(Func<double, double> audioDbAt)
    {
        (double sum, double all) = (0, 0);
        for (int k = 0; k < BandCentresHz.Length; k++)
        {
            sum += _importance[k] * Math.Clamp(1 + (audioDbAt(BandCentresHz[k]) / RangeDb), 0, 1);
            all += _importance[k];
        }

        return sum / all;
    }
}
