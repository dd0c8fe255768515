using Credtrack.Core.Reminders;
using Credtrack.Web.Features.Reminders;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Features.Reminders;

/// <summary>Runs the jobs at the time that a test's clock shows, and looks at what came of it.</summary>
internal static class Reminding
{
    public static async Task MakesReminders(this RunningSite site)
    {
        await using var scope = site.Services.CreateAsyncScope();
        await ActivatorUtilities.CreateInstance<OverdueReadings>(scope.ServiceProvider).Run(CancellationToken.None);
    }

    public static async Task SendsDigests(this RunningSite site)
    {
        await using var scope = site.Services.CreateAsyncScope();
        await ActivatorUtilities.CreateInstance<Digests>(scope.ServiceProvider).Run(CancellationToken.None);
    }

    /// <summary>Both jobs, at a time in UTC.</summary>
    public static async Task RunsAt(this RunningSite site, string time)
    {
        site.At(time);
        await site.MakesReminders();
        await site.SendsDigests();
    }

    public static void At(this RunningSite site, string time) => site.Clock.Now = DateTimeOffset.Parse(time, null, System.Globalization.DateTimeStyles.AssumeUniversal);

    public static Task<List<Reminder>> Reminders(this World world, Person person) =>
        world.Site.Ask(db => db.Reminders.AsNoTracking().Where(r => r.PersonId == person.Id).OrderBy(r => r.MadeAt).ToListAsync());

    /// <summary>A waiting scan whose pictures were taken out: only its supervisor can read it.</summary>
    public static async Task<Guid> OnlyFor(this World world, Person supervisor)
    {
        var scan = await world.Waiting(world.Entry(supervisor: supervisor));
        await world.With(scan, s => s.TakeOut(world.Reader, s.Pictures[0], $"A name can be read. {World.Secret}", world.Now));
        return scan.Id;
    }

    public static Task Changes(this World world, Person person, Action<Person, Programme> done) => world.Site.Ask(async db =>
    {
        done(await db.People.Include(p => p.Memberships).SingleAsync(p => p.Id == person.Id), await db.Programmes.SingleAsync(p => p.Id == world.Programme.Id));
        return await db.SaveChangesAsync();
    });
}
