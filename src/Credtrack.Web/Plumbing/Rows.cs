using System.Text.Json;

namespace Credtrack.Web.Plumbing;

/// <summary>Rows that somebody wrote past this program: a value that no column of this kind can hold is a finding, not a fault of ours.</summary>
public static class Rows
{
    /// <summary>False if the reading ended at a value that cannot be read.</summary>
    public static async Task<bool> CanBeRead(Func<Task> read)
    {
        try
        {
            await read();
            return true;
        }
        catch (Exception odd) when (IsOddValue(odd) || odd is InvalidOperationException { InnerException: { } inner } && IsOddValue(inner))
        {
            return false;
        }
    }

    private static bool IsOddValue(Exception fault) => fault is FormatException or JsonException or InvalidCastException or OverflowException or ArgumentOutOfRangeException;
}
