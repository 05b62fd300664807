using System;

namespace Convection.Correlations.Flows;

/// <summary>What a terminal's data sheet and the design say of its jet; members left out are not known.</summary>
/// <remarks>With height, opening, distance and design state the library can tell whether a cool jet stays at the ceiling.</remarks>
public sealed record TerminalData
{
    /// <summary>Height of the slot or ring that the jet leaves through, b [m], in (0, 1].</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside its interval or not a number.</exception>
    public double? SlotHeightMetres { get; init => field = Positive(value, 1, "Slot height of a terminal", "m", nameof(SlotHeightMetres)); }

    /// <summary>Constant K of the jet's decay [-], from the data sheet, in (0, 20]; about 1 for radial ceiling jets, 4 to 7 for grilles (recalled, low).</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside its interval or not a number.</exception>
    public double? DecayConstant { get; init => field = Positive(value, 20, "Decay constant of a terminal", string.Empty, nameof(DecayConstant)); }

    /// <summary>Distance over which the jet should follow the ceiling, to the wall it blows at [m], in (0, 100].</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside its interval or not a number.</exception>
    public double? ReachMetres { get; init => field = Positive(value, 100, "Reach of a terminal", "m", nameof(ReachMetres)); }

    /// <summary>Flow in the design state [m³/s], in (0, 1000].</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside its interval or not a number.</exception>
    public double? DesignCubicMetresPerSecond { get; init => field = Positive(value, 1000, "Design flow of a terminal", "m³/s", nameof(DesignCubicMetresPerSecond)); }

    /// <summary>Supply less room temperature in the design state [K], −50 to 50; negative when cooling.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Outside its interval or not a number.</exception>
    public double? DesignDifferenceKelvins
    {
        get;
        init => field = value is null ? null : Require.Within(value.Value, -50, 50, "Design temperature difference of a terminal", "K", nameof(DesignDifferenceKelvins));
    }

    private static double? Positive(double? value, double highest, string quantity, string unit, string name)
        => value is null ? null : Require.Positive(value.Value, highest, quantity, unit, name);
}
