namespace HarmonicSweep.Reports.Drawing;

/// <summary>Keeps labels off each other: a label that finds no free place is left out, and its mark stays.</summary>
internal sealed class Labels(Box area)
{
    private readonly List<Box> _taken = [];

    /// <summary>Draws a mark that no label may cover.</summary>
    public void ReserveMark(Sheet sheet, SeriesLook look, Spot spot)
    {
        const double room = 4;
        sheet.Mark(look.Mark, spot.X, spot.Y, 3.2, look.Colour);
        _taken.Add(new Box(spot.X - room, spot.Y - room, spot.X + room, spot.Y + room));
    }

    /// <summary>Writes a label of one or two lines near a spot, where it first fits: above, beside, higher.</summary>
    /// <returns>Whether it was written.</returns>
    public bool TryWrite(Sheet sheet, Spot spot, TextStyle style, params string[] lines)
    {
        double width = lines.Max(l => Roboto.Width(l, style)), step = style.Size + 1, height = lines.Length * step;
        foreach ((double dx, double dy) in Places(width, height))
        {
            double middle = spot.X + dx, bottom = spot.Y + dy;
            var box = new Box(middle - width / 2 - 1, bottom - height, middle + width / 2 + 1, bottom + 1);
            if (!area.Contains(box) || _taken.Exists(t => t.Overlaps(box)))
            {
                continue;
            }

            _taken.Add(box);
            for (int i = 0; i < lines.Length; i++)
            {
                sheet.Write(lines[i], middle, bottom - (lines.Length - 1 - i) * step - 2, style with { Anchor = Anchor.Middle, Halo = true });
            }

            return true;
        }

        return false;
    }

    private static IEnumerable<(double Dx, double Dy)> Places(double width, double height)
    {
        yield return (0, -5);
        yield return (width / 2 + 6, 0.5 * height);
        yield return (-width / 2 - 6, 0.5 * height);
        yield return (width / 2 + 4, -3);
        yield return (-width / 2 - 4, -3);
        yield return (0, -5 - height);
    }
}
