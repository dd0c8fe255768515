using Credtrack.Web.Features.Reminders;
using Credtrack.Web.Features.Scans.Pictures;
using Credtrack.Web.Features.Sessions;
using Hangfire;

namespace Credtrack.Web;

/// <summary>Every schedule of the program. A job finds what is due in our own tables and does it row by row: run twice or cut off, nothing is lost or done twice.</summary>
public static class Jobs
{
    public static void Schedule(this WebApplication app)
    {
        if (app.Services.GetService<IRecurringJobManager>() is not { } jobs) return;
        // In UTC; a job that goes by the site's clock looks at it itself. Zones differ by quarters of an hour.
        jobs.AddOrUpdate<OverdueReadings>(nameof(OverdueReadings), job => job.Run(CancellationToken.None), "0 * * * *");
        jobs.AddOrUpdate<Digests>(nameof(Digests), job => job.Run(CancellationToken.None), "*/15 * * * *");
        jobs.AddOrUpdate<AbandonedPictures>(nameof(AbandonedPictures), job => job.Run(CancellationToken.None), "20 3 * * *");
        jobs.AddOrUpdate<EndedSessions>(nameof(EndedSessions), job => job.Run(CancellationToken.None), "40 3 * * *");
    }

    public static void AddJobs(this IServiceCollection services, Settings settings, Store store)
    {
        if (!settings.Jobs) return;
        services.AddSingleton(_ => store.Schedules(settings.ConnectionString));
        services.AddHangfire(jobs => jobs.SetDataCompatibilityLevel(CompatibilityLevel.Version_180).UseSimpleAssemblyNameTypeSerializer().UseRecommendedSerializerSettings());
        // One after the other: nothing here is in a hurry, and the embedded database has one writer.
        services.AddHangfireServer(server => server.WorkerCount = 1);
    }
}
