using System;
using System.Linq;
using Convection.Correlations.Air;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Flows;
using Convection.Correlations.Jets;
using Convection.Correlations.Laws;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using Convection.Correlations.Selection;
using Convection.Correlations.Surfaces;
using Xunit;

namespace Convection.Correlations.Tests.Robustness;

/// <summary>Random and awkward arguments to the public entry points: documented exceptions, or a result that keeps its promises.</summary>
public class FuzzTests
{
    private const int Cases = 1_000_000;

    private static readonly double[] Awkward =
    [
        0, -0.0, 1, -1, 20, 1e-300, -1e-300, 1e300, -1e300, 1e9, -273.15, -273.16, 10_000, 10_001, double.NaN, double.PositiveInfinity,
        double.NegativeInfinity, double.Epsilon, double.MaxValue, double.MinValue,
    ];

    private static readonly RoomConvection[] Rooms = [.. TestRooms.All.Select(r => RoomConvection.Bind(r))];

    [Fact]
    public void PublicEntryPoints_AMillionArguments_ThrowOnlyWhatIsDocumented()
    {
        var random = new Random(20261201);
        Action<Random>[] entries =
        [
            r => _ = new AirState(Any(r), Any(r), Any(r)).Properties,
            r => _ = AirState.AtAltitude(Any(r), Any(r), Any(r)).DewPointCelsius,
            r => _ = AirProperties.FromValues(Any(r), Any(r), Any(r), Any(r), Any(r)),
            r => _ = new SurfaceContext(Text(r), (SurfaceKind)r.Next(-2, 7), Any(r), Any(r)) { TiltDegrees = Any(r), AreaSquareMetres = Any(r), PerimeterMetres = Any(r) }.HydraulicDiameterMetres,
            r => _ = new RoomContext(Text(r), Any(r), [new("a", SurfaceKind.Wall, 2, 2)]).Volume,
            r => _ = new SideWallJet(Text(r)) { OpeningSquareMetres = Any(r), Terminal = new() { SlotHeightMetres = Any(r), ReachMetres = Any(r), DesignDifferenceKelvins = Any(r) } }.Opening,
            r => _ = new SurfacePlacement(Text(r), (Placement)r.Next(-2, 12), (StreamDirection)r.Next(-2, 6)),
            r => _ = CorrelationId.TryParse(Text(r), out CorrelationId id) && id.IsNone,
            r => _ = CorrelationId.Parse(Text(r)),
            r => _ = PublishedLiterature.Registry.GetOrNull(CorrelationId.TryParse(Text(r), out CorrelationId id) ? id : default),
            r => _ = new Interval(Any(r), Any(r)).Contains(Any(r)),
            r => _ = new PowerLaw(Any(r), Any(r), (CharacteristicLength)r.Next(-1, 9), Any(r)).Formula,
            r => _ = new FlowLaw((DrivingVariable)r.Next(-1, 9), Any(r), Any(r), Any(r)).Formula,
            r => _ = new MixingLaw(Any(r), r.Next(2) == 0, Any(r)).Mix(Any(r), Any(r)),
            r => _ = new BlendRule { AssistingExponent = Any(r), OpposingFloor = Any(r) },
            r => _ = new ConvectionPolicy { HeaterRamp = Any(r), MinimumConductance = Any(r), OutOfRange = (OutOfRangeRule)r.Next(-1, 6) },
            r => _ = JetRules.SeparationMetres(JetRules.Archimedes(Any(r), Any(r), Any(r), Any(r)), Any(r)),
            r => _ = JetRules.RoundJetSpeed(Any(r), Any(r), Any(r), Any(r)),
            r => _ = ClosureConversion.ToOutlet([Any(r), Any(r)], [Any(r), Any(r)], Any(r)),
            r => _ = PublishedLiterature.Registry.All[r.Next(PublishedLiterature.Registry.Count)].Bind(Binding).Evaluate(Any(r)),
            Evaluate,
            Evaluate,
            Evaluate,
            Evaluate,
        ];
        for (int i = 0; i < Cases; i++)
        {
            int entry = random.Next(entries.Length);
            try
            {
                entries[entry](random);
            }
            catch (Exception documented) when (documented is ArgumentException or FormatException)
            {
                // Documented: the message must say something of use.
                Assert.True(documented.Message.Length > 10);
            }
        }
    }

    /// <summary>A bad state of one surface changes no bit of another's, whatever it is.</summary>
    [Fact]
    public void BadSurface_AnyAwkwardValue_LeavesTheOthersBitForBit()
    {
        foreach (RoomConvection room in Rooms)
        {
            double[] surfaces = [.. room.Room.Surfaces.Select((_, i) => 18.0 + i)];
            DeviceState[] devices = [.. room.Room.Devices.Select(Running)];
            var good = new ConvectionResult[surfaces.Length];
            room.Evaluate(21, surfaces, devices, good);
            foreach (double bad in Awkward)
            {
                double[] spoiled = [.. surfaces];
                spoiled[0] = bad;
                var results = new ConvectionResult[surfaces.Length];
                room.Evaluate(21, spoiled, devices, results);
                Assert.Equal(good.Skip(1), results.Skip(1));
                Assert.True(results[0].IsValid == bad is >= -273.15 and <= 10_000);
            }
        }
    }

    private static readonly LawBinding Binding = new(new SurfaceContext("s", SurfaceKind.Wall, 4, 2.5), new AirState(22).Properties);

    private static void Evaluate(Random r)
    {
        RoomConvection room = Rooms[r.Next(Rooms.Length)];
        double[] surfaces = [.. room.Room.Surfaces.Select(_ => Any(r))];
        DeviceState[] devices = [.. room.Room.Devices.Select(_ => r.Next(4) switch
        {
            0 => DeviceState.Supply(Any(r), Any(r)),
            1 => DeviceState.Stream(Any(r), Any(r)),
            2 => DeviceState.Heating(Any(r)),
            _ => DeviceState.Off,
        })];
        var results = new ConvectionResult[surfaces.Length];
        room.Evaluate(Any(r), surfaces, devices, results);
        foreach (ConvectionResult result in results)
        {
            bool isNumber = double.IsFinite(result.FluxWattsPerSquareMetre) && double.IsFinite(result.FluxPerSurfaceKelvin) && double.IsFinite(result.FluxPerRoomKelvin);
            Assert.True(result.IsValid == isNumber && result.Status != ConvectionStatus.NotEvaluated);
        }
    }

    private static DeviceState Running(FlowDescriptor device) => device.Needs switch
    {
        StateNeed.OutputFraction => DeviceState.Heating(0.5),
        StateNeed.Speed => DeviceState.Stream(0.4, 24),
        _ => DeviceState.Supply(0.1, 16),
    };

    private static double Any(Random r) => r.Next(5) switch
    {
        0 => Awkward[r.Next(Awkward.Length)],
        1 => BitConverter.Int64BitsToDouble(r.NextInt64(long.MinValue, long.MaxValue)),
        2 => r.NextDouble(),
        _ => (r.NextDouble() * 80) - 20,
    };

    private static string Text(Random r)
    {
        const string Letters = "ab-/ 1\u00e4\t\"A";
        return new string([.. Enumerable.Range(0, r.Next(8)).Select(_ => Letters[r.Next(Letters.Length)])]);
    }
}
