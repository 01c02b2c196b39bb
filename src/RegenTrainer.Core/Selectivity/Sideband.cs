namespace RegenTrainer.Core.Selectivity;

/// <summary>How one audio frequency fares, relative to the carrier.</summary>
/// <param name="AudioHz">Audio frequency in Hz.</param>
/// <param name="UpperDb">Upper sideband in dB.</param>
/// <param name="LowerDb">Lower sideband in dB.</param>
/// <param name="AudioDb">What an ideal envelope detector hears at small depth, in dB.</param>
public readonly record struct Sideband(double AudioHz, double UpperDb, double LowerDb, double AudioDb);

/// <summary>A station beside the tuned one, heard at equal strength.</summary>
/// <param name="OffsetHz">Offset from the station in Hz, either sign.</param>
/// <param name="RelativeDb">Its response relative to the station's in dB.</param>
public readonly record struct Neighbour(double OffsetHz, double RelativeDb);

/// <summary>One point of the response from antenna electromotive force to output.</summary>
/// <param name="FrequencyHz">Frequency in Hz.</param>
/// <param name="GainDb">Gain in dB.</param>
/// <param name="PhaseDegrees">Phase in degrees, -180 to 180.</param>
public readonly record struct ResponsePoint(double FrequencyHz, double GainDb, double PhaseDegrees);
