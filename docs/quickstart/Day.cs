using System;
using System.Collections.Generic;
using System.Diagnostics;
using System.Globalization;
using System.Linq;
using Convection.Correlations.Evaluation;

namespace Convection.Correlations.Quickstart;

/// <summary>The steps of a day with their results.</summary>
internal sealed record Day(RoomConvection Room, IReadOnlyList<DayStep> Steps, IReadOnlyList<ConvectionResult[]> Results)
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(1);

    /// <summary>Supply air changes per hour [1/h].</summary>
    public double AirChanges(int step) => Steps[step].FlowPerHour / Room.Room.VolumeCubicMetres;

    public static Day Run(RoomConvection room, IReadOnlyList<DayStep> steps, Action<string> progress)
    {
        var results = new List<ConvectionResult[]>(steps.Count);
        var watch = Stopwatch.StartNew();
        TimeSpan reported = TimeSpan.Zero;
        foreach (DayStep step in steps)
        {
            var surfaces = new ConvectionResult[room.Surfaces.Count];
            room.Evaluate(step.Room, step.Surfaces, Devices(room, step), surfaces);
            results.Add(surfaces);
            if (watch.Elapsed - reported > Patience)
            {
                reported = watch.Elapsed;
                progress(string.Create(CultureInfo.InvariantCulture, $"{results.Count} of {steps.Count} steps"));
            }
        }

        return new Day(room, steps, results);
    }

    private static DeviceState[] Devices(RoomConvection room, DayStep step) => [.. room.Room.Devices.Select(device => device.Name switch
    {
        Office.Radiator => DeviceState.Heating(step.RadiatorOutput),
        _ => DeviceState.Supply(step.FlowPerHour / 3600, step.Supply),
    })];
}
