namespace Convection.Correlations.Registry;

/// <summary>What a correlation rests on, strongest for a room first.</summary>
public enum EvidenceKind
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>Measured in a full-scale room.</summary>
    FullScaleRoom = 1,

    /// <summary>Measured in a climate chamber of room size.</summary>
    ClimateChamber = 2,

    /// <summary>Measured on isolated plates, or fitted to pooled plate data.</summary>
    Plate = 3,

    /// <summary>Theory or computation.</summary>
    Analytical = 4,

    /// <summary>A handbook's value or fit.</summary>
    Handbook = 5,

    /// <summary>A convention of a standard.</summary>
    Standard = 6,
}
