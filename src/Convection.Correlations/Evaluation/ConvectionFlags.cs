using System;

namespace Convection.Correlations.Evaluation;

/// <summary>What a reader of a result should know about it.</summary>
[Flags]
public enum ConvectionFlags
{
    /// <summary>Nothing.</summary>
    None = 0,

    /// <summary>A temperature difference is below the tested range of its correlation.</summary>
    BelowTestedRange = 1,

    /// <summary>A temperature difference, flow or speed is above the tested range.</summary>
    AboveTestedRange = 2,

    /// <summary>Inside the tested range, but where this library advises against the correlation.</summary>
    OutsideAdvisedRange = 4,

    /// <summary>Outside the tested range, inside a justified extension of it.</summary>
    InExtendedRange = 8,

    /// <summary>The surface itself, its height or tilt for instance, is outside the tested range.</summary>
    SurfaceOutsideRange = 16,

    /// <summary>The range used for these judgements is assumed.</summary>
    RangeAssumed = 32,

    /// <summary>The range of a correlation is not known.</summary>
    RangeNotKnown = 64,

    /// <summary>The flow is below the lowest tested one, and the forced flux is faded towards zero with it.</summary>
    FlowFaded = 128,

    /// <summary>The coefficient is held at the limit of its range, as the policy asks.</summary>
    HeldAtLimit = 256,

    /// <summary>Fluxes point opposite ways; no published rule blends them, the library's own does.</summary>
    OppositeFluxes = 512,

    /// <summary>Room air stands in for local, outlet or undisturbed air, which the state does not hold.</summary>
    ReferenceSubstituted = 1024,

    /// <summary>The text of a correlation, or a part that matters, is not confirmed.</summary>
    UnconfirmedText = 2048,

    /// <summary>A correlation was made for a like surface, such as a wall's on a window.</summary>
    NearMatch = 4096,

    /// <summary>No correlation covers the surface or a running device; what stands in is in the explanation.</summary>
    GapInEvidence = 8192,

    /// <summary>A dimensional formula was scaled to the temperature, pressure and humidity of the room's air.</summary>
    ScaledToAir = 16384,

    /// <summary>A correlation was fixed by hand.</summary>
    Pinned = 32768,

    /// <summary>A fixed value of a standard is in use.</summary>
    FixedValue = 65536,

    /// <summary>The policy's minimum conductance moves the coefficient.</summary>
    MinimumConductance = 131072,
}
