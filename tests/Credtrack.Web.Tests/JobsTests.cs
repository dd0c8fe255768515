using System.Threading.Channels;
using Credtrack.Web.Features.Reminders;
using Credtrack.Web.Tests.Features.Reminders;
using Hangfire;
using Hangfire.Common;
using Hangfire.States;
using Hangfire.Storage;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.TestHost;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests;

/// <summary>The real job server from the schedule to the letter.</summary>
public sealed class JobsTests(JobsTests.WorkingSite site) : IClassFixture<JobsTests.WorkingSite>
{
    [Fact]
    public void Every_schedule_is_there_after_a_start()
    {
        using var schedules = site.Services.GetRequiredService<JobStorage>().GetConnection();
        Assert.Equal(["AbandonedPictures 20 3 * * *", "Digests */15 * * * *", "EndedSessions 40 3 * * *", "OverdueReadings 0 * * * *"],
            schedules.GetRecurringJobs().Select(j => $"{j.Id} {j.Cron}").Order());
    }

    [Fact]
    public async Task A_scan_that_waits_too_long_becomes_one_letter_however_often_the_jobs_run()
    {
        site.At("2026-03-01 12:00");
        var world = await site.NewWorld();
        await world.Waiting();
        site.At("2026-03-08 07:00");
        for (var again = 0; again < 2; again++) await site.Runs(nameof(OverdueReadings));
        site.At("2026-03-08 08:00");
        for (var again = 0; again < 2; again++) await site.Runs(nameof(Digests));
        Assert.Single(site.Office.For(World.AddressOf(world.Reader)));
        Assert.Equal(world.Now, Assert.Single(await world.Reminders(world.Reader)).SentAt);
    }

    [Theory]
    [InlineData("AbandonedPictures")]
    [InlineData("EndedSessions")]
    public Task The_other_jobs_run_to_their_end(string job) => site.Runs(job);

    public sealed class WorkingSite : PostedSite
    {
        private readonly Watch watch = new();

        /// <summary>Has a job run now by the server, and waits until it has ended well.</summary>
        public async Task Runs(string job)
        {
            var id = Services.GetRequiredService<IRecurringJobManagerV2>().TriggerJob(job);
            string ended;
            do ended = await watch.Ended.Reader.ReadAsync().AsTask().WaitAsync(TimeSpan.FromMinutes(1)); while (!ended.StartsWith(id, StringComparison.Ordinal));
            Assert.Equal($"{id} Succeeded", ended);
        }

        protected override void ConfigureWebHost(IWebHostBuilder builder)
        {
            base.ConfigureWebHost(builder);
            builder.UseSetting("Jobs:On", "true");
            builder.ConfigureTestServices(services => services.AddSingleton<IJobFilterProvider>(watch));
        }
    }

    /// <summary>Hears from the job server how each job ended.</summary>
    private sealed class Watch : IJobFilterProvider, IApplyStateFilter
    {
        public Channel<string> Ended { get; } = Channel.CreateUnbounded<string>();

        public IEnumerable<JobFilter> GetFilters(Job job) => JobFilterProviders.Providers.GetFilters(job).Append(new JobFilter(this, JobFilterScope.Global, null));

        public void OnStateApplied(ApplyStateContext context, IWriteOnlyTransaction transaction)
        {
            if (context.NewState is not (EnqueuedState or ProcessingState)) Ended.Writer.TryWrite($"{context.BackgroundJob.Id} {context.NewState.Name}{(context.NewState is SucceededState ? "" : $": {context.NewState.Reason}")}");
        }

        public void OnStateUnapplied(ApplyStateContext context, IWriteOnlyTransaction transaction) { }
    }
}
