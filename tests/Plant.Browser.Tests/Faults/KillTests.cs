using Plant.Tests.Support;

namespace Plant.Browser.Tests.Faults;

/// <summary>SIGKILL of the real server while several clients write: what was acknowledged is there once and whole, what was not sent is not there.</summary>
public sealed class KillTests
{
    private const int Kills = 25;
    private const int Clients = 4;

    [Fact]
    public async Task Kill_UnderLoad_LosesNothingAcknowledged()
    {
        await using var server = await ServerProcess.StartAsync("Production");
        await WritingClient.PrepareRegisterAsync(server);
        var (code, output, error) = await server.CommandAsync("token", "--name", "kill test", "--role", "administrator");
        Assert.True(code == 0, error);
        var token = output.TrimEnd().Split('\n')[^1].Trim();
        var random = new Random(20261130);
        var clients = Enumerable.Range(1, Clients).Select(number => new WritingClient(server, token, number)).ToList();

        for (var kill = 0; kill < Kills; kill++)
        {
            using var stop = new CancellationTokenSource();
            var writing = clients.Select(client => client.WriteUntilStoppedAsync(stop.Token)).ToList();
            await Task.Delay(random.Next(100, 700));
            await server.KillAsync();
            await stop.CancelAsync();
            await Task.WhenAll(writing);
            await server.StartAsync();
            foreach (var client in clients)
            {
                await client.RepeatUnansweredAsync();
            }
        }

        Assert.True(clients.Sum(client => client.Acknowledged) > Kills, "the clients hardly wrote: the test shows nothing");
        foreach (var client in clients)
        {
            await client.AssertRegisterHoldsExactlyWhatWasSentAsync();
        }

        var verified = await server.CommandAsync("verify");
        Assert.True(verified.Code == 0, verified.Output + verified.Error);
        TestContext.Current.SendDiagnosticMessage("{0} kills, {1} writes acknowledged, {2} repeated", Kills,
            clients.Sum(client => client.Acknowledged), clients.Sum(client => client.Repeated));
    }
}
