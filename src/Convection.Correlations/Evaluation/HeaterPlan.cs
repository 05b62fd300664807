using Convection.Correlations.Laws;

namespace Convection.Correlations.Evaluation;

/// <summary>A heater's laws on one surface.</summary>
internal sealed class HeaterPlan(int device, LawUse? warmer, LawUse? cooler)
{
    public int Device { get; } = device;

    public LawUse? On(bool isWarmer) => isWarmer ? warmer : cooler;

    /// <summary>Weight of the heater's law: 0 when off, 1 from the ramp's end, with a continuous slope between.</summary>
    public static double Weight(double outputFraction, double ramp) => Crossfade.Weight(outputFraction, 0, ramp);
}
