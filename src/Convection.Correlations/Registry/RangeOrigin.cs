namespace Convection.Correlations.Registry;

/// <summary>Where a stated range comes from.</summary>
public enum RangeOrigin
{
    /// <summary>Not given; refused.</summary>
    Unspecified = 0,

    /// <summary>The source's own range.</summary>
    Source = 1,

    /// <summary>The source's range as remembered, not compared with print.</summary>
    Recalled = 2,

    /// <summary>Assumed here, for warnings only; the source's range is not known.</summary>
    Assumed = 3,
}
