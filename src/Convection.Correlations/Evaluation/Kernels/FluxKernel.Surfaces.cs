using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
#if !NET
using T = Convection.Correlations.Evaluation.Kernels.ScalarLane;
#endif

namespace Convection.Correlations.Evaluation.Kernels;

/// <content>A surface: still air giving way to heaters, the devices' forced parts, and their blend.</content>
#if NET
internal static unsafe partial class FluxKernel<T>
#else
internal static unsafe partial class FluxKernel
#endif
{
    private const int MinimumExponent = 6;

    /// <summary>Convection at the surfaces of a lane.</summary>
    /// <param name="shape">What they have in common.</param>
    /// <param name="numbers">Their own numbers.</param>
    /// <param name="surface">Their temperatures [°C], finite.</param>
    /// <param name="room">Temperature of the air of their rooms [°C], finite.</param>
    /// <param name="devices">For each device that they need the lanes of <see cref="DeviceLanes"/>, one after the other.</param>
    /// <param name="sum">Takes the fluxes and the parts they were made of.</param>
    public static void Surface(SurfaceShape shape, Numbers numbers, T surface, T room, double* devices, out Outcome sum)
    {
        sum = default;
        T difference = surface - room;
        sum.IsWarmer = difference >= T.Of(0);
        AddBuoyant(shape, numbers, difference, devices, ref sum);
        if (shape.Forced.Length == 0)
        {
            sum.Total = sum.Buoyant;
            return;
        }

        var pools = default(Pools);
        T strongest = T.Of(-1);
        foreach (ForcedShape forced in shape.Forced)
        {
            AddForced(forced, shape, numbers, surface, room, devices, ref sum, ref pools, ref strongest);
        }

        Finish(shape, pools, ref sum);
    }

    /// <summary>Still air, giving way to heaters as their output rises.</summary>
    private static void AddBuoyant(SurfaceShape shape, Numbers numbers, T difference, double* devices, ref Outcome sum)
    {
        T size = T.Abs(difference);
        Sides(shape.Warmer, shape.Cooler, numbers, sum.IsWarmer, size, out T h, out T sensitivity);
        if (shape.Heaters.Length > 0)
        {
            AddHeaters(shape, numbers, size, devices, ref sum, ref h, ref sensitivity);
        }

        if (shape.MinimumConductance > 0)
        {
            T least = T.Of(shape.MinimumConductance), least2 = least * least, h2 = h * h;
            T raised = Power((h2 * h2 * h2) + (least2 * least2 * least2), new Exponent(1.0 / MinimumExponent));
            T part = h / raised, part2 = part * part;
            sensitivity *= part2 * part2 * part;
            h = raised;
        }

        T slope = h + sensitivity;
        sum.BuoyantCoefficient = h;
        sum.CoefficientBeforeForced = h;
        sum.Buoyant = new Flux(h * difference, slope, -slope, T.Of(0));
    }

    private static void AddHeaters(SurfaceShape shape, Numbers numbers, T size, double* devices, ref Outcome sum, ref T h, ref T sensitivity)
    {
        T rest = T.Of(1), weights = T.Of(0), heated = T.Of(0), heatedSensitivity = T.Of(0), mixed = T.Of(0);
        foreach (HeaterShape heater in shape.Heaters)
        {
            T weight = Weight(DeviceLane(devices, heater.Slot, DeviceLanes.Output), T.Of(1 / shape.HeaterRamp));
            weight = heater.Warmer is null ? weight & ~sum.IsWarmer : weight;
            weight = heater.Cooler is null ? weight & sum.IsWarmer : weight;
            T isOn = weight > T.Of(0);
            if (!T.Any(isOn))
            {
                continue;
            }

            Sides(heater.Warmer, heater.Cooler, numbers, sum.IsWarmer, size, out T law, out T lawSensitivity);
            rest *= T.Of(1) - weight;
            weights += weight;
            heated += T.Select(isOn, weight * law, T.Of(0));
            heatedSensitivity += T.Select(isOn, weight * lawSensitivity, T.Of(0));
            mixed += T.Select(sum.IsWarmer, T.Of(heater.WarmerIsMixed ? 1 : 0), T.Of(heater.CoolerIsMixed ? 1 : 0)) * weight;
        }

        T any = weights > T.Of(0);
        if (T.Any(any))
        {
            T share = (T.Of(1) - rest) / T.Select(any, weights, T.Of(1)), needsStill = rest > T.Of(0);
            h = T.Select(any, T.Select(needsStill, rest * h, T.Of(0)) + (share * heated), h);
            sensitivity = T.Select(any, T.Select(needsStill, rest * sensitivity, T.Of(0)) + (share * heatedSensitivity), sensitivity);
            sum.MixedWeight = share * mixed;
        }
    }

    /// <summary>A law for each side; NaN on a side that has none.</summary>
    private static void Sides(LawShape? warmer, LawShape? cooler, Numbers numbers, T isWarmer, T x, out T h, out T sensitivity)
    {
        if (warmer is not null && ReferenceEquals(warmer, cooler))
        {
            Law(warmer, numbers, x, out h, out sensitivity);
            return;
        }

        h = sensitivity = T.Of(double.NaN);
        if (warmer is not null && T.Any(isWarmer))
        {
            Law(warmer, numbers, x, out h, out sensitivity);
        }

        T isCooler = ~isWarmer;
        if (T.Any(isCooler))
        {
            T below = T.Of(double.NaN), belowSensitivity = below;
            if (cooler is not null)
            {
                Law(cooler, numbers, x, out below, out belowSensitivity);
            }

            h = T.Select(isCooler, below, h);
            sensitivity = T.Select(isCooler, belowSensitivity, sensitivity);
        }

        if (warmer is null)
        {
            h = T.Select(isWarmer, T.Of(double.NaN), h);
            sensitivity = T.Select(isWarmer, T.Of(double.NaN), sensitivity);
        }
    }

    private static void AddForced(
        ForcedShape forced, SurfaceShape shape, Numbers numbers, T surface, T room, double* devices, ref Outcome sum, ref Pools pools, ref T strongest)
    {
        T driving = DeviceLane(devices, forced.Slot, forced.DrivenBy == DrivingVariable.Speed ? DeviceLanes.Speed : DeviceLanes.Flow);
        if (forced.DrivenBy != DrivingVariable.Speed)
        {
            driving = forced.DrivenBy == DrivingVariable.JetMomentum ? numbers[forced.Scale] * driving * driving : numbers[forced.Scale] * driving;
        }

        T isOn = driving > T.Of(0);
        if (!T.Any(isOn))
        {
            return;
        }

        T air = DeviceLane(devices, forced.Slot, DeviceLanes.Air);
        if (forced.Warmer is { } one && ReferenceEquals(one.Law, forced.Cooler?.Law))
        {
            T reference = Reference(one.Reference, air, room, out T isRoom);
            AddForced(one, forced.Stream, shape, numbers, isOn, surface - reference, isRoom, driving, ref sum, ref pools, ref strongest);
            return;
        }

        if (forced.Warmer is { } warmer)
        {
            T difference = surface - Reference(warmer.Reference, air, room, out T isRoom);
            AddForced(warmer, forced.Stream, shape, numbers, isOn & (difference >= T.Of(0)), difference, isRoom, driving, ref sum, ref pools, ref strongest);
        }

        if (forced.Cooler is { } cooler)
        {
            T difference = surface - Reference(cooler.Reference, air, room, out T isRoom);
            AddForced(cooler, forced.Stream, shape, numbers, isOn & (difference < T.Of(0)), difference, isRoom, driving, ref sum, ref pools, ref strongest);
        }
    }

    private static void AddForced(
        ForcedSide side,
        StreamDirection stream,
        SurfaceShape shape,
        Numbers numbers,
        T isActive,
        T difference,
        T isRoom,
        T driving,
        ref Outcome sum,
        ref Pools pools,
        ref T strongest)
    {
        if (!T.Any(isActive))
        {
            return;
        }

        Law(side.Law, numbers, driving, out T h, out _);
        h &= isActive;
        Flux flux = new Flux(h * difference, h, -(h & isRoom), -(h & ~isRoom)).Where(isActive);
        pools.Add(stream, flux, shape.Blend);

        T size = T.Abs(flux.Value), leads = isActive & (size > strongest);
        strongest = T.Select(leads, size, strongest);
        sum.ForcedCoefficient = T.Select(leads, h, sum.ForcedCoefficient);
        sum.ForcedReference = T.Select(leads, T.Select(isRoom, T.Of((int)ReferenceTemperature.RoomAir), T.Of((int)side.Reference)), sum.ForcedReference);
        if (side.ContainsBuoyancy)
        {
            // Buoyancy gives way to a forced law that contains it.
            T weight = side.Fades ? Weight(driving, T.Of(1) / numbers[side.Law.FirstLimit]) : T.Of(1);
            weight &= isActive;
            sum.Buoyant = sum.Buoyant.Times(T.Of(1) - weight);
            sum.BuoyantCoefficient *= T.Of(1) - weight;
            sum.MixedWeight = T.Max(sum.MixedWeight, weight);
        }
    }

    /// <summary>The reference that the state can serve: room air where it holds neither local, outlet nor free-stream temperature.</summary>
    private static T Reference(ReferenceTemperature reference, T air, T room, out T isRoom)
    {
        if (reference == ReferenceTemperature.SupplyAir)
        {
            isRoom = T.Of(0);
            return air;
        }

        T isGiven = air <= T.Of(double.MaxValue);
        isRoom = reference == ReferenceTemperature.FreeStream ? ~isGiven : ~T.Of(0);
        return T.Select(isRoom, room, air);
    }

    private static void Finish(SurfaceShape shape, Pools pools, ref Outcome sum)
    {
        BlendShape blend = shape.Blend;
        Flux up = Pool(pools.Up, pools.UpCold, blend), down = Pool(pools.Down, pools.DownCold, blend);
        Flux assisting = Flux.Select(sum.IsWarmer, up, down), opposing = Flux.Select(sum.IsWarmer, down, up);
        Flux transverse = Pool(pools.Across, pools.AcrossCold, blend);
        Flux total = Add(sum.Buoyant, assisting, blend.Assisting, blend);
        total = Oppose(total, opposing, blend);
        sum.Total = Add(total, transverse, blend.Transverse, blend);
        sum.Forced = Pool(Pool(assisting, opposing, blend), transverse, blend).Value;
        sum.Assisting = assisting.Value;
        sum.Opposing = opposing.Value;
        sum.Transverse = transverse.Value;
        sum.HasOppositeDevices = IsAny(pools.Up, pools.Down, pools.Across) & IsAny(pools.UpCold, pools.DownCold, pools.AcrossCold);
    }

    private static T IsAny(Flux a, Flux b, Flux c) => ~(T.Abs(a.Value | b.Value | c.Value) <= T.Of(0));

    /// <summary>Forced fluxes of several devices or directions together.</summary>
    private static Flux Pool(Flux one, Flux other, BlendShape blend) => Add(one, other, blend.Transverse, blend);

    /// <summary>0 at nothing, 1 from the end of a ramp, with a continuous slope between.</summary>
    private static T Weight(T x, T perRamp)
    {
        T u = T.Min(T.Max(x * perRamp, T.Of(0)), T.Of(1));
        return u * u * (T.Of(3) - (u + u));
    }

    private static T DeviceLane(double* devices, int slot, int member) => T.Load(devices + (((slot * DeviceLanes.Count) + member) * T.Width));

    /// <summary>What one surface's convection is made of.</summary>
    internal struct Outcome
    {
        public Flux Total, Buoyant;
        public T IsWarmer, BuoyantCoefficient, CoefficientBeforeForced, MixedWeight;
        public T Forced, ForcedCoefficient, ForcedReference, Assisting, Opposing, Transverse, HasOppositeDevices;
    }

    /// <summary>Forced fluxes by stream, into the air and out of it. Devices whose stream runs the same way and whose heat flows the same way add up as in transverse flow.</summary>
    private struct Pools
    {
        public Flux Up, UpCold, Down, DownCold, Across, AcrossCold;

        public void Add(StreamDirection stream, Flux flux, BlendShape blend)
        {
            T isCold = flux.Value < T.Of(0);
            switch (stream)
            {
                case StreamDirection.Up:
                    Add(ref Up, ref UpCold, flux, isCold, blend);
                    break;
                case StreamDirection.Down:
                    Add(ref Down, ref DownCold, flux, isCold, blend);
                    break;
                default:
                    Add(ref Across, ref AcrossCold, flux, isCold, blend);
                    break;
            }
        }

        private static void Add(ref Flux warm, ref Flux cold, Flux flux, T isCold, BlendShape blend)
        {
            warm = Pool(warm, flux.Where(~isCold), blend);
            cold = Pool(cold, flux.Where(isCold), blend);
        }
    }
}
