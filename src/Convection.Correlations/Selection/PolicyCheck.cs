using System;
using System.Collections.Generic;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;

namespace Convection.Correlations.Selection;

/// <summary>Refuses a policy that speaks of what is not there.</summary>
internal static class PolicyCheck
{
    public static void Against(ConvectionPolicy policy, RoomContext room, CorrelationRegistry registry)
    {
        Known(policy.Prefer, nameof(ConvectionPolicy.Prefer), registry);
        Known(policy.Exclude, nameof(ConvectionPolicy.Exclude), registry);
        foreach (SurfacePin pin in policy.Pins)
        {
            Known([pin.Correlation], nameof(ConvectionPolicy.Pins), registry);
            if (room.IndexOfSurface(pin.Surface) < 0)
            {
                throw new ArgumentException(
                    "The policy pins a correlation to the surface '" + pin.Surface + "', which room '" + room.Name
                    + "' does not have. Its surfaces: " + room.SurfaceNames + ".",
                    nameof(policy));
            }

            if (registry[pin.Correlation].Family == CorrelationFamily.Total)
            {
                throw new ArgumentException(
                    "'" + pin.Correlation + "' contains radiation and cannot serve as a convective coefficient of surface '" + pin.Surface + "'.",
                    nameof(policy));
            }
        }
    }

    private static void Known(IReadOnlyList<CorrelationId> ids, string member, CorrelationRegistry registry)
    {
        foreach (CorrelationId id in ids)
        {
            try
            {
                _ = registry[id];
            }
            catch (KeyNotFoundException missing)
            {
                throw new ArgumentException("The policy's " + member + " cannot be followed. " + missing.Message, missing);
            }
        }
    }
}
