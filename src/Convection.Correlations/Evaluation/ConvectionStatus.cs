namespace Convection.Correlations.Evaluation;

/// <summary>Whether a surface's result holds numbers, and if not, why.</summary>
public enum ConvectionStatus
{
    /// <summary>Not evaluated; what a result holds before anything is written to it.</summary>
    NotEvaluated = 0,

    /// <summary>The numbers hold. Read the flags beside them.</summary>
    Valid = 1,

    /// <summary>A temperature, flow, speed or output that this surface needs is not a finite number.</summary>
    NotFinite = 2,

    /// <summary>
    /// A state is impossible: a temperature outside −273.15 °C to 10 000 °C, a negative flow or speed, a flow above
    /// 1 000 000 m³/s, a speed above 1000 m/s, an output fraction outside 0 to 1.
    /// </summary>
    Unphysical = 3,

    /// <summary>Supply air flows and its temperature is not given.</summary>
    SupplyTemperatureMissing = 4,

    /// <summary>A device got the state of another kind of device, such as a flow for a radiator.</summary>
    DeviceStateUnsuitable = 5,

    /// <summary>A correlation is out of its range, and the policy refuses to extend it.</summary>
    OutOfRangeRefused = 6,

    /// <summary>The registry holds no correlation for this surface on this side of the air's temperature.</summary>
    NoCorrelation = 7,
}
