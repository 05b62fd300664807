using System;
using Convection.Correlations.Laws;

namespace Convection.Correlations.Registry;

/// <summary>The cross-checks that every correlation passes before a registry holds it.</summary>
internal static class CorrelationContract
{
    public static void Check(Correlation c)
    {
        Demand(!c.Id.IsNone, c, "it has no id.");
        Demand(!string.IsNullOrWhiteSpace(c.Title), c, "it has no title.");
        Demand(c.Publication is not null && c.Publication.Key == c.Id.PublicationKey, c, "its publication's key is not the first part of its id.");
        Demand(c.Applies is not null && c.Applies.Surfaces != SurfaceSet.None, c, "it names no surface.");
        Demand(c.Applies!.Driver != default, c, "it does not say what drives the flow.");
        Demand(c.Applies.Sense != HeatFlowSense.Unspecified, c, "its sense of heat flow is not given.");
        Demand((c.Applies.Condition is null) == (c.Applies.ConditionText.Length == 0), c, "a further condition and its words go together.");
        Demand(c.Law is not null && c.Range is not null && c.Evidence is not null, c, "law, range or evidence is missing.");
        Demand(c.TextCheck != TextCheck.Unspecified, c, "it does not say how its text was checked.");
        bool byDifference = c.Law!.DrivenBy is DrivingVariable.TemperatureDifference or DrivingVariable.None;
        switch (c.Family)
        {
            case CorrelationFamily.Buoyant:
                Demand(byDifference && ByAir(c), c, "a buoyant law depends on the temperature difference and refers to air.");
                break;
            case CorrelationFamily.FixedValue:
                Demand(c.Law.DrivenBy == DrivingVariable.None, c, "a fixed value depends on nothing.");
                break;
            case CorrelationFamily.Forced:
                Demand(!byDifference && ByAir(c), c, "a forced law depends on a flow or speed and refers to air.");
                break;
            case CorrelationFamily.Mixed:
                Demand(c.ContainsBuoyancy, c, "a mixed law contains buoyancy and must say so.");
                break;
            case CorrelationFamily.Total:
                break;
            default:
                Demand(false, c, "its family is not given.");
                break;
        }

        Demand(
            c.Law is not FlowLaw { Intercept: not 0 } || HasLowestFlow(c.Range!),
            c,
            "a flow law with an intercept needs a lowest tested flow, from which its flux can fade to zero.");
        Demand(c.Reference != ReferenceTemperature.Unspecified, c, "its reference temperature is not given.");
        Demand(
            c.Reference != ReferenceTemperature.Operative || c.Family is CorrelationFamily.Total or CorrelationFamily.FixedValue,
            c,
            "only coefficients that contain radiation, or follow from such by subtraction, refer to operative temperature.");
    }

    private static bool HasLowestFlow(ValidityRange range)
    {
        foreach (RangeLimit limit in range.Limits)
        {
            if (limit.Variable is RangeVariable.AirChangeRate or RangeVariable.JetMomentum or RangeVariable.FlowPerLength or RangeVariable.Reynolds
                && limit.Tested.Lowest > 0)
            {
                return true;
            }
        }

        return false;
    }

    private static bool ByAir(Correlation c) => c.Reference is not (ReferenceTemperature.Operative or ReferenceTemperature.Unspecified);

    private static void Demand(bool holds, Correlation correlation, string problem)
    {
        if (!holds)
        {
            throw new CorrelationContractException(correlation.Id, problem);
        }
    }
}
