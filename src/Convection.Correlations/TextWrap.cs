using System.Text;

namespace Convection.Correlations;

/// <summary>Breaks long lines of texts between words.</summary>
internal static class TextWrap
{
    private const int Width = 110;

    /// <summary>Appends words, each further line indented, and ends the line.</summary>
    public static void Line(StringBuilder text, string indent, string words, string hanging = "  ")
    {
        text.Append(indent);
        int column = indent.Length;
        bool first = true;
        foreach (string word in words.Split(' '))
        {
            if (!first && column + 1 + word.Length > Width)
            {
                text.Append('\n').Append(indent).Append(hanging);
                column = indent.Length + hanging.Length;
            }
            else if (!first)
            {
                text.Append(' ');
                column++;
            }

            text.Append(word);
            column += word.Length;
            first = false;
        }

        text.Append('\n');
    }
}
