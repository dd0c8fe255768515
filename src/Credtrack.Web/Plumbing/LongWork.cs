using System.Collections.Concurrent;

namespace Credtrack.Web.Plumbing;

/// <summary>
/// Work that takes longer than a browser waits, begun by a request. What it owes stands in its own rows, so that a kill loses nothing:
/// whoever looks again finds it cut off and takes it up.
/// </summary>
public sealed class LongWork(IServiceScopeFactory scopes, ILogger<LongWork> log)
{
    private readonly ConcurrentDictionary<Guid, int> running = new();

    /// <summary>How many pieces the work has that runs for this subject; null if none runs.</summary>
    public int? PiecesOf(Guid subject) => running.TryGetValue(subject, out var pieces) ? pieces : null;

    /// <summary>Once at a time for a subject.</summary>
    public void Start(Guid subject, int pieces, Func<IServiceProvider, Task> work)
    {
        if (running.TryAdd(subject, pieces)) _ = Task.Run(() => Run(subject, work));
    }

    private async Task Run(Guid subject, Func<IServiceProvider, Task> work)
    {
        try
        {
            await using var scope = scopes.CreateAsyncScope();
            await work(scope.ServiceProvider);
        }
        catch (Exception fault)
        {
            Log.WorkCutOff(log, subject, fault);
        }
        finally
        {
            running.TryRemove(subject, out _);
        }
    }
}
