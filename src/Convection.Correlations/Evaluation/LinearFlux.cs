namespace Convection.Correlations.Evaluation;

/// <summary>A flux as an implicit heat balance wants it: q ≈ PerSurfaceKelvin·T_surface + PerRoomKelvin·T_room + Constant.</summary>
/// <remarks>
/// The tangent at the state it was taken at, temperatures in °C, supply and stream temperatures held where they were. In the row of a
/// surface, A·PerSurfaceKelvin goes to the diagonal, A·PerRoomKelvin to the column of the room air, and −A·Constant to the right-hand side;
/// in the row of the room air the same three enter with the opposite sign. The default value is no flux.
/// </remarks>
public readonly record struct LinearFlux
{
    internal LinearFlux(double perSurfaceKelvin, double perRoomKelvin, double constant)
    {
        PerSurfaceKelvin = perSurfaceKelvin;
        PerRoomKelvin = perRoomKelvin;
        Constant = constant;
    }

    /// <summary>∂q/∂T_surface [W/(m²·K)].</summary>
    public double PerSurfaceKelvin { get; }

    /// <summary>∂q/∂T_room [W/(m²·K)].</summary>
    public double PerRoomKelvin { get; }

    /// <summary>The rest [W/m²], for temperatures in °C.</summary>
    public double Constant { get; }

    /// <summary>The linear flux at other temperatures [W/m²].</summary>
    /// <param name="surfaceCelsius">Temperature of the surface [°C].</param>
    /// <param name="roomCelsius">Temperature of the room air [°C].</param>
    /// <returns>q ≈ PerSurfaceKelvin·T_surface + PerRoomKelvin·T_room + Constant.</returns>
    public double At(double surfaceCelsius, double roomCelsius) => (PerSurfaceKelvin * surfaceCelsius) + (PerRoomKelvin * roomCelsius) + Constant;
}
