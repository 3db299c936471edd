using System.Numerics;
using HarmonicSweep.Reports.Drawing;
using HarmonicSweep.Studies;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>The shaded rows of a heat map, as few rectangles as show the same: neighbours of equal shade are merged.</summary>
internal static class HeatRows
{
    private const double CellWidth = 1;
    private const int Shades = 64;

    public static void Draw(Sheet sheet, Panel panel, PositionMap map, LogScale shade, double rowHeight)
    {
        var boxes = new List<Box>[Shades];
        int cells = (int)Math.Round(panel.Area.Width / CellWidth);
        for (int row = 0; row < map.Ohm.Count; row++)
        {
            double top = panel.Area.Top + row * rowHeight;
            int?[] shades = [.. CellValues(panel, map.Orders, map.Ohm[row], cells).Select(ShadeOf)];
            for (int first = 0; first < cells;)
            {
                int next = first + 1;
                while (next < cells && shades[next] == shades[first])
                {
                    next++;
                }

                double left = panel.Area.Left + first * CellWidth, right = Math.Min(panel.Area.Left + next * CellWidth, panel.Area.Right);
                var box = new Box(left, top, right, top + rowHeight);
                if (shades[first] is { } s)
                {
                    (boxes[s] ??= []).Add(box);
                }
                else
                {
                    sheet.Fill(box, Look.Span);
                    if (box.Width > 40)
                    {
                        sheet.Write("open", (left + right) / 2, top + rowHeight / 2 + 4, Look.Note with { Anchor = Anchor.Middle });
                    }
                }

                first = next;
            }
        }

        for (int s = 0; s < Shades; s++)
        {
            sheet.Fill((boxes[s] ?? []).ToArray(), Look.Heat((s + 0.5) / Shades));
        }

        int? ShadeOf(double? ohm) => ohm is { } z ? Math.Min((int)(shade.Fraction(z) * Shades), Shades - 1) : null;
    }

    /// <summary>Largest |Z| in every cell, so that no peak is lost; between scanned points the nearest one.</summary>
    private static double?[] CellValues(Panel panel, IReadOnlyList<double> orders, IReadOnlyList<Complex?> ohm, int cells)
    {
        var values = new double?[cells];
        int nearest = 0;
        for (int cell = 0; cell < cells; cell++)
        {
            double from = OrderAt(cell), to = OrderAt(cell + 1), middle = (from + to) / 2;
            while (nearest + 1 < orders.Count && Math.Abs(orders[nearest + 1] - middle) <= Math.Abs(orders[nearest] - middle))
            {
                nearest++;
            }

            double? value = ohm[nearest]?.Magnitude;
            for (int i = nearest; i >= 0 && orders[i] >= from; i--)
            {
                value = Larger(value, ohm[i]);
            }

            for (int i = nearest; i < orders.Count && orders[i] <= to; i++)
            {
                value = Larger(value, ohm[i]);
            }

            values[cell] = value;
        }

        return values;

        double OrderAt(int cell) => panel.Across.From + (panel.Across.To - panel.Across.From) * cell / cells;

        static double? Larger(double? value, Complex? other) =>
            other is not { } z ? value : value is { } v ? Math.Max(v, z.Magnitude) : z.Magnitude;
    }
}
