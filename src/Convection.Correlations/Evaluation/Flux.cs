namespace Convection.Correlations.Evaluation;

/// <summary>A heat flux with its slopes: value [W/m²], and per kelvin of surface, room and supply temperature [W/(m²·K)].</summary>
internal readonly struct Flux
{
    public Flux(double value, double surface, double room, double supply)
    {
        Value = value;
        Surface = surface;
        Room = room;
        Supply = supply;
    }

    public double Value { get; }

    public double Surface { get; }

    public double Room { get; }

    public double Supply { get; }

    /// <summary>True for no flux at all, in value and slopes.</summary>
    public bool IsNothing => Value == 0 && Surface == 0 && Room == 0 && Supply == 0;

    public Flux Times(double factor) => new(factor * Value, factor * Surface, factor * Room, factor * Supply);

    public Flux Plus(Flux other) => new(Value + other.Value, Surface + other.Surface, Room + other.Room, Supply + other.Supply);

    /// <summary>A function of two fluxes with its value and its slopes to either.</summary>
    public static Flux Chain(double value, double perA, Flux a, double perB, Flux b) => new(
        value,
        (perA * a.Surface) + (perB * b.Surface),
        (perA * a.Room) + (perB * b.Room),
        (perA * a.Supply) + (perB * b.Supply));
}
