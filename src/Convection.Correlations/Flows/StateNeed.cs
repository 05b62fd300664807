using System;

namespace Convection.Correlations.Flows;

/// <summary>What the state of a device must hold while the device runs.</summary>
[Flags]
public enum StateNeed
{
    /// <summary>Nothing.</summary>
    None = 0,

    /// <summary>Volume flow of supply air [m³/s].</summary>
    Flow = 1,

    /// <summary>Temperature of the supply air [°C].</summary>
    SupplyTemperature = 2,

    /// <summary>Speed of the stream along the surfaces [m/s].</summary>
    Speed = 4,

    /// <summary>Output of a heater as a fraction of its full output, 0 to 1.</summary>
    OutputFraction = 8,
}
