using HarmonicSweep.Network;
using static System.FormattableString;

namespace HarmonicSweep.Studies;

/// <summary>Warnings about states: dead buses, dropped injections, open buses, hand checks that do not agree.</summary>
internal static class StateFindings
{
    /// <summary>Findings of all states; the same fact in several states is said once, with the states named.</summary>
    public static IReadOnlyList<Finding> Of(StudyRequest request, IReadOnlyList<StateResult> states)
    {
        var said = new Dictionary<Finding, List<string>>();
        void Say(Finding finding, string state)
        {
            if (!said.TryGetValue(finding, out List<string>? where))
            {
                said[finding] = where = [];
            }

            where.Add(state);
        }

        foreach (StateResult state in states)
        {
            if (state.PowerFlowFailure is { } failure)
            {
                Say(
                    failure with
                    {
                        Severity = Severity.Warning,
                        Message = failure.Message.TrimEnd('.') + "; impedances do not depend on it and are given, distortion cannot be",
                    },
                    state.State);
            }

            foreach (string bus in state.DeadBuses)
            {
                Say(
                    new Finding(
                        Severity.Warning, "HS210", request.Plant.Bus(bus).Location,
                        $"bus {bus} is dead: no closed path to a supply or generator in service; its voltage is 0 and its distortion is not judged",
                        "close a coupler or put an element of the path in service, if the bus is meant to be live."),
                    state.State);
            }

            foreach (string bus in state.OpenBuses)
            {
                Say(
                    new Finding(
                        Severity.Warning, "HS213", request.Plant.Bus(bus).Location,
                        $"bus {bus} has no path to ground in the harmonic network: its impedance is open",
                        "nothing needs mending if it is meant to stand isolated; else close what connects it."),
                    state.State);
            }

            foreach (string coupler in state.LoopCouplers)
            {
                Say(
                    new Finding(
                        Severity.Note, "HS214", request.Plant.FindElement(coupler)!.Location,
                        $"coupler {coupler} closes a loop of closed couplers: it changes nothing, and how the current shares in such a loop is not determined",
                        "nothing needs mending."),
                    state.State);
            }

            foreach (IGrouping<string, DroppedInjection> byElement in state.DroppedInjections.GroupBy(d => d.Element))
            {
                string orders = string.Join(", ", byElement.Select(d => Invariant($"{d.Order}")));
                Say(
                    new Finding(
                        Severity.Warning, "HS211", request.Plant.FindElement(byElement.Key)!.Location,
                        $"order {orders} of {byElement.Key} is dropped: {byElement.First().Why}",
                        "nothing needs mending where the element is delta-connected or its triplen orders are blocked; otherwise judge these orders by other means."),
                    state.State);
            }

            foreach (HandCheck check in state.HandChecks.Where(c => !c.Agrees))
            {
                Say(
                    new Finding(
                        Severity.Warning, "HS212", request.Plant.FindElement(check.Subject)?.Location ?? request.Plant.FindBus(check.Subject)?.Location,
                        Invariant($"hand check '{check.Name}' at {check.Subject} differs by {check.RelativeDifference:P1}: by hand {check.Hand:G5} {check.Unit} ({check.Formula}), computed {check.Computed:G5} {check.Unit}"),
                        "find out why before trusting either: a rating on the wrong base, line against phase voltage, or a further element that the hand formula leaves out."),
                    state.State);
            }
        }

        return
        [
            .. said.Select(s => s.Key with
            {
                Message = s.Key.Message + (s.Value.Count == states.Count && states.Count > 1
                    ? " (every state)."
                    : $" ({(s.Value.Count == 1 ? "state" : "states")} {string.Join(", ", s.Value)})."),
            }),
        ];
    }
}
