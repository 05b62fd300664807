using System;

namespace Convection.Correlations.Quickstart;

/// <summary>One line of the day: temperatures [°C], heater output [-], supply flow [m³/h] and its temperature [°C].</summary>
internal sealed record DayStep(TimeOnly Time, double Room, double[] Surfaces, double RadiatorOutput, double FlowPerHour, double Supply);
