using Credtrack.Web.Features.Sessions;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Features.Sessions;

public sealed class EndedSessionsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_sign_in_is_forgotten_thirty_days_after_it_was_over_and_not_before()
    {
        var (world, start) = (await site.NewWorld(), site.Clock.Now);
        using var signedOut = await world.As(world.Reader);
        await signedOut.Opens("/");
        await signedOut.Presses("Sign out");
        using var ranOut = await world.As(world.Trainee); // good for twelve hours
        site.Clock.Now = start.AddDays(30);
        using var open = await world.As(world.Director);
        Assert.Equal((1, 1, 1), await AfterARun());
        site.Clock.Now = start.AddDays(30).AddMinutes(1);
        Assert.Equal((0, 1, 1), await AfterARun());
        site.Clock.Now = start.AddDays(30).AddHours(11);
        Assert.Equal((0, 1, 1), await AfterARun());
        site.Clock.Now = start.AddDays(31);
        Assert.Equal((0, 0, 1), await AfterARun());

        async Task<(int, int, int)> AfterARun()
        {
            await using var scope = site.Services.CreateAsyncScope();
            await ActivatorUtilities.CreateInstance<EndedSessions>(scope.ServiceProvider).Run(CancellationToken.None);
            return (await Of(world.Reader), await Of(world.Trainee), await Of(world.Director));
        }
    }

    private Task<int> Of(Person person) => site.Ask(db => db.Sessions.CountAsync(s => s.AccountId == person.Id));
}
